import { CONTOUR_LEVELS } from '../../../shared/ground/settlement-contours.ts';
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

/** The number of the band of a settlement among the levels that contours are drawn for; −1 below the least. */
export function bandOf(settlement: number): number {
  return CONTOUR_LEVELS.findLastIndex((level) => settlement >= level);
}

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

const MILLIMETRES = 1000;

/** A band of settlement in words, as `5 to 10 mm`. */
export function bandWords(band: number): string {
  const [from = 0, to] = [CONTOUR_LEVELS[band], CONTOUR_LEVELS[band + 1]].map((level) =>
    level === undefined ? undefined : Math.round(level * MILLIMETRES),
  );
  return to === undefined ? `${from} mm and more` : `${from} to ${to} mm`;
}
