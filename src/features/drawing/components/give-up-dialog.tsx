import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { countInWords } from '../../../lib/number-words.ts';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';

/** Asks before much of a drawing is lost. */
export function GiveUpDialog({ drafting }: Pick<PlanDrawing, 'drafting'>) {
  const { asking, keep, draft } = drafting;
  const what = draft?.tool === 'edit' ? 'changes of the outline' : 'corners';
  return (
    <ConfirmDialog
      open={asking !== null}
      title="Give up what is drawn?"
      doIt="Give it up"
      onConfirm={() => asking?.next()}
      onClose={keep}
    >
      <p>
        It is not saved: {countInWords(asking?.corners ?? 0)} {what} would be lost.
      </p>
    </ConfirmDialog>
  );
}
