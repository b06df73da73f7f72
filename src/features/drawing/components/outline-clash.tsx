import { Button } from '../../../components/ui/button.tsx';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import { outlineOf, partsOf, type ShapeDraft } from '../drafts/draft.ts';
import { rebased } from '../drafts/rebase.ts';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';
import { areaWords } from '../measure-words.ts';

type OutlineClashProps = { readonly drawing: PlanDrawing; readonly draft: ShapeDraft };

/** Somebody else changed the same building: mine or theirs, nothing lost until it is chosen. */
export function OutlineClash({ drawing, draft }: OutlineClashProps) {
  const { saving, drafting, saveOnTop } = drawing;
  const theirs = saving.fresh?.[0];
  if (theirs === undefined) return null;
  const areas = `Theirs has ${areaWords(partsOf(theirs.footprint))}, yours ${areaWords(draft.parts)}.`;
  return (
    <ErrorNote
      failed="Somebody else changed this building meanwhile."
      stands={`Nothing of yours is saved yet. ${areas}`}
      action={
        <div className="flex flex-wrap gap-2">
          <Button
            onClick={() => {
              saveOnTop(rebased(draft, [theirs]));
            }}
          >
            Save my outline
          </Button>
          <Button
            onClick={() => {
              saving.forget();
              drafting.set(outlineOf(theirs));
            }}
          >
            Take theirs
          </Button>
        </div>
      }
    />
  );
}
