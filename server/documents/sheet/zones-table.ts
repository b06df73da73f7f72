import type { OpenedWall } from '../../../shared/assessment/open-wall.ts';
import { millimetresFromMetres } from '../../../shared/units/millimetres-from-metres.ts';
import type { TableColumn, TableRow } from '../pdf/table.ts';
import { figureWords, percentFigure } from './figures.ts';
import { strainSign } from './signs.ts';

export const ZONE_COLUMNS: readonly TableColumn[] = [
  { heading: 'Zone', width: 94 },
  { heading: 'From m', width: 38, align: 'right' },
  { heading: 'To m', width: 38, align: 'right' },
  { heading: 'Δ mm', width: 42, align: 'right' },
  { heading: 'Δ/L %', width: 48, align: 'right' },
  { heading: strainSign('h', '%'), width: 50, align: 'right' },
  { heading: 'Bending %', width: 50, align: 'right' },
  { heading: 'Diagonal %', width: 50, align: 'right' },
  { heading: 'Strain %', width: 51, align: 'right' },
];

/** The zones of a wall with their strains at the central values. */
export function zoneRows({ result }: Pick<OpenedWall, 'result'>): readonly TableRow[] {
  return result.zones.map((zone, k) => ({
    isMarked: k === result.governingZone,
    cells: [
      `${k + 1} ${zone.mode}${k === result.governingZone ? ', governs' : ''}`,
      zone.start.toFixed(1),
      zone.end.toFixed(1),
      figureWords(millimetresFromMetres(zone.deflection), 2),
      percentFigure(zone.deflectionRatio, 4),
      percentFigure(zone.horizontalStrain, 4),
      percentFigure(zone.bendingStrain, 4),
      percentFigure(zone.diagonalStrain, 4),
      [{ text: percentFigure(zone.strain, 4), weight: 'strong' }],
    ],
  }));
}
