import { bandOf } from '../../../shared/presentation/settlement-bands.ts';
import type { RunMap } from '../../../shared/schemas/run-map.ts';
import { FIRST_SHADE } from '../map/shades.ts';

/** What buildings are coloured by. */
export const COLOURINGS = ['category', 'stage', 'settlement', 'nothing'] as const;
export type Colouring = (typeof COLOURINGS)[number];

/** The ends of the likely range and what is likely most. */
export const ENDS = ['low', 'central', 'high'] as const;
export type End = (typeof ENDS)[number];

/** What buildings of a run are coloured by, and the number of the colour that each takes. */
export type Shading = {
  readonly by: keyof typeof FIRST_SHADE;
  readonly shades: ReadonlyMap<number, number>;
};

/** Among its like, the number of the colour of a building; −1 where it takes none, as most of a town do. */
function numberOf(figures: RunMap, by: Shading['by'], end: End, k: number): number {
  if (by === 'category') return figures[end][k] ?? -1;
  if (by === 'settlement') return bandOf(figures.settlement[k] ?? 0);
  const stage = figures.stage[k] ?? 1;
  return stage > 1 ? stage : -1;
}

/** Which colour each building of a run takes; those that take none are not in it. */
export function shadesOfRun(figures: RunMap, by: Shading['by'], end: End): Map<number, number> {
  const shades = new Map<number, number>();
  for (const [k, id] of figures.ids.entries()) {
    const number = numberOf(figures, by, end, k);
    if (number >= 0) shades.set(id, FIRST_SHADE[by] + number);
  }
  return shades;
}

/** How many buildings take each colour. */
export function countsOfShades(shades: ReadonlyMap<number, number>): ReadonlyMap<number, number> {
  const counts = new Map<number, number>();
  for (const shade of shades.values()) counts.set(shade, (counts.get(shade) ?? 0) + 1);
  return counts;
}
