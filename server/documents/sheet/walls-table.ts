import type { BuildingResult } from '../../../shared/assessment/assess-building.ts';
import { wallLength } from '../../../shared/building/wall.ts';
import { categoryLabel } from '../../../shared/presentation/bracket-words.ts';
import { millimetresFromMetres } from '../../../shared/units/millimetres-from-metres.ts';
import { figureWords, percentFigure } from './figures.ts';
import type { TableColumn, TableRow } from '../pdf/table.ts';
import { strainSign } from './signs.ts';

export const WALL_COLUMNS: readonly TableColumn[] = [
  { heading: 'Wall', width: 96 },
  { heading: 'Length m', width: 34, align: 'right' },
  { heading: 'Settles mm', width: 44, align: 'right' },
  { heading: 'Bends', width: 57 },
  { heading: 'Δ/L %', width: 46, align: 'right' },
  { heading: strainSign('h', '%'), width: 50, align: 'right' },
  { heading: 'Strain %', width: 40, align: 'right' },
  { heading: 'Rankin', width: 70 },
  { heading: 'Cat.', width: 24, align: 'right' },
];

type WallFound = BuildingResult['walls'][number];

function rowOf({ wall, result }: WallFound, governs: boolean): TableRow {
  const zone = result.zones[result.governingZone];
  return {
    isMarked: governs,
    cells: [
      [{ text: wall.name, weight: 'strong' }, ...(governs ? [{ text: ' governs' }] : [])],
      wallLength(wall).toFixed(1),
      figureWords(millimetresFromMetres(result.settlementMax), 1),
      zone?.mode ?? 'not',
      zone === undefined ? '–' : percentFigure(zone.deflectionRatio, 4),
      zone === undefined ? '–' : percentFigure(zone.horizontalStrain, 4),
      [{ text: percentFigure(result.strain, 3), weight: 'strong' }],
      result.rankin,
      categoryLabel(result.category),
    ],
  };
}

/** Every wall at the central values, alone and in its row. */
export function wallRows({ walls, governing }: BuildingResult): readonly TableRow[] {
  return walls.map((found, k) => rowOf(found, k === governing));
}
