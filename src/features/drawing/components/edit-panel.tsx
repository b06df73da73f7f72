import { footprintArea } from '../../../../shared/building/footprint-area.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { formatFigure } from '../../../../shared/presentation/field-words.ts';
import { partsOf, type Parts, type ShapeDraft } from '../drafts/draft.ts';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';
import { areaWords } from '../measure-words.ts';
import { CornerTable } from './corner-table.tsx';
import { FigureLine } from './figure-line.tsx';
import { GiveUp } from './give-up.tsx';
import { MoreRings } from './more-rings.tsx';
import { OutlineClash } from './outline-clash.tsx';
import { PanelFrame } from './panel-frame.tsx';
import { RightAngles } from './right-angles.tsx';

function differenceWords(before: Parts, after: Parts): string {
  const metres = Number((footprintArea(after) - footprintArea(before)).toFixed(1));
  return `${metres > 0 ? '+' : ''}${formatFigure('area', metres)} m²`;
}

type EditPanelProps = { readonly drawing: PlanDrawing; readonly draft: ShapeDraft };

/** The outline of a building while it is changed. */
export function EditPanel({ drawing, draft }: EditPanelProps) {
  const { drafting, saving, save, press } = drawing;
  const before = partsOf(draft.building?.footprint ?? []);
  const isChanged = (drafting.steps?.past ?? 0) > 0;
  return (
    <PanelFrame
      title={`Outline of ${draft.building?.reference ?? ''}`}
      hint="Drag corners; drag the middle of a side to make another. A corner that is pressed can be deleted."
      actions={
        <>
          {isChanged && saving.fresh === null && (
            <Button
              kind="main"
              busy={saving.isPending}
              onClick={() => {
                save();
              }}
            >
              Save the outline
            </Button>
          )}
          <GiveUp press={press} />
        </>
      }
    >
      <MutationError failed="The outline was not saved." error={saving.error} />
      <OutlineClash drawing={drawing} draft={draft} />
      <dl>
        <FigureLine label="Area in the register" value={areaWords(before)} />
        <FigureLine label="Area as drawn" value={areaWords(draft.parts)} />
        <FigureLine label="Difference" value={differenceWords(before, draft.parts)} />
      </dl>
      <div className="mt-1.5">
        <RightAngles square={drawing.square} />
      </div>
      <MoreRings drafting={drafting} />
      <CornerTable draft={draft} chosen={drafting.chosen} onEdit={drafting.editShape} />
    </PanelFrame>
  );
}
