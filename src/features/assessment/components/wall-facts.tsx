import type { OpenedWall } from '../../../../shared/assessment/open-wall.ts';
import { millimetresFromMetres } from '../../../../shared/units/millimetres-from-metres.ts';
import { Facts } from '../../../components/ui/facts.tsx';
import { slopeWords } from '../../../../shared/presentation/slope-words.ts';
import { WorkingPopover } from './working-popover.tsx';

type Opened = Pick<OpenedWall, 'result' | 'working'>;

function wholeFigure({ working }: Opened, symbol: string, name: string, figure: string) {
  const lines = working.at(-1)?.lines.filter((line) => line.symbol === symbol) ?? [];
  if (lines.length === 0) return figure;
  return (
    <WorkingPopover title={name} lines={lines}>
      {figure}
    </WorkingPopover>
  );
}

/** What a wall does as a whole; the figures open their working. */
export function WallFacts({ opened }: { readonly opened: Opened }) {
  const { result } = opened;
  const { settlementMax, slopeMax, tilt, angularDistortion, rankin } = result;
  return (
    <Facts
      facts={[
        ['Settlement', `${millimetresFromMetres(settlementMax).toFixed(1)} mm at its lowest`],
        ['Slope', `${slopeWords(slopeMax)} where it is steepest`],
        ['Tilt', wholeFigure(opened, 'tilt', 'tilt', slopeWords(tilt))],
        [
          'Angular distortion',
          wholeFigure(
            opened,
            'angular distortion',
            'angular distortion',
            slopeWords(angularDistortion),
          ),
        ],
        ['Rankin', wholeFigure(opened, 'Rankin', 'Rankin class', `Rankin ${rankin}`)],
      ]}
    />
  );
}
