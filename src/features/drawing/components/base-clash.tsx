import { Button } from '../../../components/ui/button.tsx';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import type { Draft } from '../drafts/draft.ts';
import { rebased } from '../drafts/rebase.ts';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';

type BaseClashProps = { readonly drawing: PlanDrawing; readonly draft: Draft };

/** Somebody else changed what is split or joined: it is looked at again before it is done. */
export function BaseClash({ drawing, draft }: BaseClashProps) {
  const { saving, drafting } = drawing;
  const { fresh } = saving;
  if (fresh === null) return null;
  return (
    <ErrorNote
      failed="Somebody else changed this meanwhile."
      stands="Nothing is done yet."
      action={
        <Button
          onClick={() => {
            saving.forget();
            drafting.set(rebased(draft, fresh));
          }}
        >
          Show it as it is now
        </Button>
      }
    />
  );
}
