import { Button } from '../../../components/ui/button.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { BuildingSearch } from '../../plan/components/building-search.tsx';
import { partsOf, type JoinDraft } from '../drafts/draft.ts';
import { togglePicked } from '../drafts/edit-join.ts';
import { joinPreview } from '../drafts/join-preview.ts';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';
import { areaWords } from '../measure-words.ts';
import { BaseClash } from './base-clash.tsx';
import { FigureLine } from './figure-line.tsx';
import { GiveUp } from './give-up.tsx';
import { PanelFrame } from './panel-frame.tsx';

type JoinPanelProps = { readonly drawing: PlanDrawing; readonly draft: JoinDraft };

function Picked({ drawing, draft }: JoinPanelProps) {
  return (
    <ol aria-label="Picked" className="text-small">
      {draft.buildings.map((building, k) => (
        <li
          key={building.id}
          className="flex min-h-row items-center gap-2 border-b border-hairline py-0.5"
        >
          <b className="font-semibold">{building.reference}</b>
          {k === 0 && <span className="text-ink-3">keeps its reference</span>}
          <span className="ml-auto">{areaWords(partsOf(building.footprint))}</span>
          <Button
            kind="quiet"
            className="h-6"
            aria-label={`Let go of ${building.reference}`}
            onClick={() => {
              drawing.drafting.editJoin((now) => togglePicked(now, building));
            }}
          >
            Let go
          </Button>
        </li>
      ))}
    </ol>
  );
}

/** Buildings while they are picked to become one. */
export function JoinPanel({ drawing, draft }: JoinPanelProps) {
  const { saving, save, press, pick, schemeId } = drawing;
  const joined = joinPreview(draft.buildings.map(({ footprint }) => partsOf(footprint)));
  return (
    <PanelFrame
      title="Join buildings"
      hint="Press neighbours on the map one after another. The first keeps its reference and values; gaps are filled from the others."
      actions={
        <>
          {joined !== null && saving.fresh === null && (
            <Button
              kind="main"
              busy={saving.isPending}
              onClick={() => {
                save();
              }}
            >
              Join them{' '}
              <span className="max-sm:hidden">
                <KeyCap>Enter</KeyCap>
              </span>
            </Button>
          )}
          <GiveUp press={press} />
        </>
      }
    >
      <MutationError failed="The buildings were not joined." error={saving.error} />
      <BaseClash drawing={drawing} draft={draft} />
      <Picked drawing={drawing} draft={draft} />
      <div aria-live="polite">
        {joined !== null && (
          <dl>
            <FigureLine label="Together" value={areaWords(joined)} />
          </dl>
        )}
        {joined === null && draft.buildings.length > 1 && (
          <p className="py-1 text-small font-medium text-clay-deep">
            They do not touch: only buildings that share a wall, or stand at most 5 cm apart, can be
            joined.
          </p>
        )}
      </div>
      <div className="mt-3">
        <BuildingSearch
          schemeId={schemeId}
          onChoose={({ id }) => {
            pick(id);
          }}
        />
      </div>
    </PanelFrame>
  );
}
