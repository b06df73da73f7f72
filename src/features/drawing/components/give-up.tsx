import { Button } from '../../../components/ui/button.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';

/** The way out of a draft. */
export function GiveUp({ press }: Pick<PlanDrawing, 'press'>) {
  return (
    <Button
      onClick={() => {
        press('select');
      }}
    >
      Give up{' '}
      <span className="max-sm:hidden">
        <KeyCap>Esc</KeyCap>
      </span>
    </Button>
  );
}
