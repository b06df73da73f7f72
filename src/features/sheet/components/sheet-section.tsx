import type { OpenedWall } from '../../../../shared/assessment/open-wall.ts';
import type { BuildingSheet } from '../../../../shared/assessment/sheet-of-building.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import { InteractionChart } from '../../assessment/components/interaction-chart.tsx';
import { WallSectionChart } from '../../assessment/components/wall-section-chart.tsx';
import { ZonesTable } from '../../assessment/components/zones-table.tsx';

type SheetSectionProps = {
  readonly sheet: BuildingSheet;
  readonly index: number;
  readonly opened: OpenedWall | null;
};

function titleOf({ strain }: BuildingSheet, index: number): string {
  const name = strain?.walls[index]?.wall.name ?? '';
  return index === strain?.governing ? `Wall ${name}, which governs` : `Wall ${name}`;
}

/** What the ground does to the wall that is opened, down to the working. */
export function SheetSection({ sheet, index, opened }: SheetSectionProps) {
  if (opened === null) {
    return (
      <Panel title="Section">
        <p className="mt-2 text-roomy">
          {sheet.outcome.fault ?? 'This building has no wall that could be worked out.'}
        </p>
      </Panel>
    );
  }
  return (
    <div className="min-w-0">
      <Panel
        title={titleOf(sheet, index)}
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
  );
}
