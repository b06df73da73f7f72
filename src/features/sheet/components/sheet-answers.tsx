import type { OpenedWall } from '../../../../shared/assessment/open-wall.ts';
import type { BuildingSheet } from '../../../../shared/assessment/sheet-of-building.ts';
import { resultOfOutcome } from '../../../../shared/assessment/result-of-outcome.ts';
import { METHOD_VERSION } from '../../../../shared/method-version.ts';
import { CAUTIONS } from '../../../../shared/cautions.ts';
import type { RunBuilding, RunDetail } from '../../../../shared/schemas/runs.ts';
import { MeasuresPanel } from '../../measures/components/measures-panel.tsx';
import { PartiesOfBuilding } from '../../parties/components/parties-of-building.tsx';
import { DecisionPanel } from '../../decisions/components/decision-panel.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { Warnings } from '../../assessment/components/warnings.tsx';
import { WallFacts } from '../../assessment/components/wall-facts.tsx';
import { stageWords } from '../../../../shared/presentation/result-words.ts';
import { assumedWords, plainWords } from '../../../../shared/presentation/plain-words.ts';
import { RangePanels } from './range-panels.tsx';

type SheetAnswersProps = {
  readonly run: RunDetail;
  readonly building: RunBuilding;
  readonly sheet: BuildingSheet;
  readonly opened: OpenedWall | null;
};

/** Whether what was worked out here is what was recorded, figure by figure. */
function Record({ run, building, sheet }: SheetAnswersProps) {
  const again = JSON.stringify(resultOfOutcome(sheet.outcome));
  const isSame = again === JSON.stringify(building.result);
  if (!isSame && run.methodVersion !== METHOD_VERSION) {
    return (
      <p className="mt-2 text-small text-ink-2">
        {`Recorded by version ${run.methodVersion} of the method. This page works with version ${METHOD_VERSION}, so figures may differ from the record.`}
      </p>
    );
  }
  return (
    <p className={isSame ? 'mt-2 text-cap text-ink-2' : 'mt-2 text-small text-clay-deep'}>
      {isSame
        ? `Worked out again in this browser from what run ${run.number} went by: the same figures as recorded, to the last digit.`
        : `Worked out again in this browser, the figures differ from the record of run ${run.number}. The record stands; tell whoever looks after this workbench.`}
    </p>
  );
}

/** What the figures mean: in plain words, the bracket, the breakpoint, the stage, and the cautions. */
export function SheetAnswers(props: SheetAnswersProps) {
  const { building, opened } = props;
  const { result } = building;
  const assumed = assumedWords(result.assumed);
  return (
    <div className="min-w-0 lg:col-span-2 xl:col-span-1 print:mt-5 print:grid print:grid-cols-2 print:gap-x-8 print:gap-y-5 print:[&>section]:mt-0 print:[&>section]:break-inside-avoid">
      <Panel title="In plain words">
        <div className="mt-2 border-l-4 border-clay pl-3 text-roomy">
          {plainWords(result).map((sentence) => (
            <p key={sentence} className="[&+&]:mt-1.5">
              {sentence}
            </p>
          ))}
          {assumed !== null && <p className="mt-1.5">{assumed}</p>}
        </div>
        <Record {...props} />
      </Panel>
      <RangePanels {...props} />
      {opened !== null && (
        <Panel title="The wall as a whole" note={`wall ${opened.wall.name}`}>
          <WallFacts opened={opened} />
        </Panel>
      )}
      <Panel title="Stage" note="by the figures; nothing is decided by them">
        <p className="mt-2 text-small">{stageWords(result)}</p>
        <Warnings names={result.warnings} />
      </Panel>
      <DecisionPanel
        run={props.run}
        building={{ id: Number(building.facts.id), reference: building.facts.reference }}
      />
      <MeasuresPanel run={props.run} building={building} />
      <PartiesOfBuilding buildingId={Number(building.facts.id)} />
      <Panel title="Cautions">
        <ul className="mt-2 list-disc pl-4 text-small text-ink-2">
          {CAUTIONS.map((caution) => (
            <li key={caution}>{caution}</li>
          ))}
        </ul>
      </Panel>
    </div>
  );
}
