import { Link } from 'react-router-dom';
import type { OpenedWall } from '../../../../shared/assessment/open-wall.ts';
import type { BuildingSheet } from '../../../../shared/assessment/sheet-of-building.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import { InteractionChart } from '../../assessment/components/interaction-chart.tsx';
import { WallSectionChart } from '../../assessment/components/wall-section-chart.tsx';
import { ZonesTable } from '../../assessment/components/zones-table.tsx';
import { whatIfOfWall } from '../what-if-of-wall.ts';

type SheetSectionProps = {
  readonly sheet: BuildingSheet;
  readonly index: number;
  readonly opened: OpenedWall | null;
};

function titleOf({ strain }: BuildingSheet, index: number): string {
  const name = strain?.walls[index]?.wall.name ?? '';
  return index === strain?.governing ? `Wall ${name}, which governs` : `Wall ${name}`;
}

/** To the page where other values may be tried; nothing where no drive moves the wall. */
function TryOut({ sheet, opened }: { sheet: BuildingSheet; opened: OpenedWall }) {
  const path = whatIfOfWall(sheet.inputs.model, opened.wall, sheet.inputs.rules);
  if (path === undefined) return null;
  return (
    <Link to={path} className="print:hidden">
      Try other values on this wall
    </Link>
  );
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
    <div className="min-w-0 print:mt-5 print:[&>section]:break-inside-avoid">
      <Panel
        title={titleOf(sheet, index)}
        note="settlement at the central values; the band is the bracket, clay lines are chords"
        action={<TryOut sheet={sheet} opened={opened} />}
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
