import type { OpenedWall } from '../../../../shared/assessment/open-wall.ts';
import { pieceBesideWall } from '../../../../shared/assessment/piece-beside-wall.ts';
import type { BuildingSheet } from '../../../../shared/assessment/sheet-of-building.ts';
import type { Bracket } from '../../../../shared/assessment/bracket.ts';
import type { Piece } from '../../../../shared/ground/piece.ts';
import { troughWidthMatters } from '../../../../shared/ground/trough-width-matters.ts';
import { breakpointWords, settledWords } from '../../../../shared/presentation/bracket-words.ts';
import { reserveWords } from '../../../../shared/presentation/result-words.ts';
import { strainRange } from '../../../../shared/presentation/strain-range.ts';
import type { RunBuilding, RunDetail } from '../../../../shared/schemas/runs.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import { BracketTable } from '../../assessment/components/bracket-table.tsx';
import { BreakpointBar } from '../../assessment/components/breakpoint-bar.tsx';
import { RangeBar } from '../../assessment/components/range-bar.tsx';
import { useSamples } from '../samples/use-samples.ts';
import { useSeed } from '../samples/use-seed.ts';
import { SamplesPanel } from './samples-panel.tsx';

type RangePanelsProps = {
  readonly run: RunDetail;
  readonly building: RunBuilding;
  readonly sheet: BuildingSheet;
  readonly opened: OpenedWall | null;
};

type BracketPanelProps = {
  readonly sheet: BuildingSheet;
  readonly bracket: Bracket;
  readonly beside: Piece;
  /** With samples the verdict is theirs and the bracket's together, and stands with them. */
  readonly hasVerdict: boolean;
};

function BracketPanel({ sheet, bracket, beside, hasVerdict }: BracketPanelProps) {
  const { inputs, strain } = sheet;
  return (
    <Panel title="Bracket" note="volume loss down, K across; the worst of all walls, strain %">
      <div className="mt-2">
        <BracketTable
          bracket={bracket}
          volumeLoss={beside.volumeLoss}
          troughWidth={troughWidthMatters(inputs.model) ? beside.troughWidth : null}
        />
      </div>
      <div className="mt-2">
        <RangeBar strain={strainRange(bracket)} />
      </div>
      {strain?.sensitivity !== undefined && hasVerdict && (
        <p className="mt-1 text-small">{settledWords(strain.sensitivity)}</p>
      )}
    </Panel>
  );
}

function WithRange({
  run,
  building,
  sheet,
  bracket,
  beside,
}: Omit<BracketPanelProps, 'hasVerdict'> & Omit<RangePanelsProps, 'opened'>) {
  const { seed, draw } = useSeed(run.id);
  const drawn = useSamples(run, building, seed);
  const breakpoint = sheet.strain?.breakpoint;
  return (
    <>
      <BracketPanel {...{ sheet, bracket, beside }} hasVerdict={drawn.samples === null} />
      <Panel title="Breakpoint" note="volume loss that makes it the category that leads on">
        <div className="mt-2">
          <BreakpointBar breakpoint={breakpoint} volumeLoss={beside.volumeLoss} />
          <p className="mt-1 text-small">
            {/* of a building that screening lets go the run records none */}
            {building.result.strain === null
              ? breakpointWords(breakpoint, beside.volumeLoss)
              : reserveWords(building.result)}
          </p>
        </div>
      </Panel>
      <SamplesPanel seed={seed} onDraw={draw} {...drawn} />
    </>
  );
}

/** What the likely range of the inputs does: bracket, breakpoint, and samples where they are asked for. */
export function RangePanels({ opened, ...props }: RangePanelsProps) {
  const { bracket } = props.sheet.strain ?? {};
  const { model } = props.sheet.inputs;
  const beside = opened === null ? undefined : pieceBesideWall(model, opened.wall)?.piece;
  if (bracket === undefined || beside === undefined) return null;
  return <WithRange {...props} bracket={bracket} beside={beside} />;
}
