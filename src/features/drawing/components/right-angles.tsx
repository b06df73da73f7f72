import { Checkbox } from '../../../components/ui/checkbox.tsx';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';

/** Keeps right angles without a key held, as for a finger. */
export function RightAngles({ square }: Pick<PlanDrawing, 'square'>) {
  return (
    <Checkbox
      label="Right angles"
      hint="Or hold Shift. Nothing snaps meanwhile."
      checked={square.isSquare}
      onChange={({ target }) => {
        square.setSquare(target.checked);
      }}
    />
  );
}
