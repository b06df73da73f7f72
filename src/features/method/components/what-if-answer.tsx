import { METHOD_VERSION } from '../../../../shared/method-version.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import { breakpointWords } from '../../../../shared/presentation/bracket-words.ts';
import { BracketTable } from '../../assessment/components/bracket-table.tsx';
import { BreakpointBar } from '../../assessment/components/breakpoint-bar.tsx';
import { CopyButton } from '../../assessment/components/copy-button.tsx';
import { InteractionChart } from '../../assessment/components/interaction-chart.tsx';
import { RangeBar } from '../../assessment/components/range-bar.tsx';
import { Warnings } from '../../assessment/components/warnings.tsx';
import { WallFacts } from '../../assessment/components/wall-facts.tsx';
import { WallSectionChart } from '../../assessment/components/wall-section-chart.tsx';
import { WorkingList } from '../../assessment/components/working-list.tsx';
import { ZonesTable } from '../../assessment/components/zones-table.tsx';
import { strainRange } from '../../../../shared/presentation/strain-range.ts';
import type { WorkedWhatIf } from '../what-if/work-what-if.ts';
import { WhatIfVerdict } from './what-if-verdict.tsx';

function Answers({ worked }: { readonly worked: WorkedWhatIf }) {
  const { opened, volumeLoss, troughWidth } = worked;
  const { bracket, breakpoint } = opened;
  return (
    <div className="min-w-0">
      <Panel title="Bracket" note="volume loss down, K across; strain %">
        <div className="mt-2">
          <BracketTable bracket={bracket} volumeLoss={volumeLoss} troughWidth={troughWidth} />
        </div>
        <div className="mt-2">
          <RangeBar strain={strainRange(bracket)} />
          <p className="text-cap text-ink-2">
            Strain from low to high, among the limits of the categories.
          </p>
        </div>
      </Panel>
      <Panel title="Breakpoint" note="volume loss that makes it category 3">
        <div className="mt-2">
          <BreakpointBar breakpoint={breakpoint} volumeLoss={volumeLoss} />
          <p className="mt-1 text-small">
            {breakpointWords(breakpoint, volumeLoss)}
            {breakpoint !== undefined &&
              ` Factor ${breakpoint.factor.toFixed(2)}; reserve ${breakpoint.reserveOverCentral.toFixed(2)} over the central value, ${breakpoint.reserveOverHigh.toFixed(2)} over the high.`.replaceAll(
                /-(?=\d)/g,
                '\u2212',
              )}
          </p>
        </div>
      </Panel>
      <Panel title="The wall as a whole">
        <WallFacts opened={opened} />
      </Panel>
    </div>
  );
}

/** What the drive does to the wall, with everything that it rests on. */
export function WhatIfAnswerView({ worked }: { readonly worked: WorkedWhatIf }) {
  const { opened, asked } = worked;
  return (
    <>
      <WhatIfVerdict worked={worked} />
      <Warnings names={opened.result.warnings} />
      <div className="mt-4 grid gap-x-8 gap-y-5 xl:grid-cols-[minmax(0,5fr)_minmax(280px,3fr)] print:block">
        <div className="min-w-0">
          <Panel
            title="Section"
            note="settlement at the central values; the band is the bracket, clay lines are chords"
          >
            <WallSectionChart drawn={opened} />
            <div className="mt-2">
              <ZonesTable opened={opened} />
            </div>
          </Panel>
          <Panel title="Category by strain" note="nine points of the bracket">
            <div className="mt-2 max-w-[560px]">
              <InteractionChart opened={opened} />
            </div>
          </Panel>
        </div>
        <Answers worked={worked} />
      </div>
      <Panel
        title="Working"
        note={`at the central values, by version ${METHOD_VERSION}`}
        action={
          <CopyButton textOf={() => JSON.stringify(asked, null, 2)}>
            Copy as a case for assess
          </CopyButton>
        }
      >
        <WorkingList sections={opened.working} />
      </Panel>
    </>
  );
}
