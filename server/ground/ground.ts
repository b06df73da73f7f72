import type { GroundAnswer } from '../../shared/schemas/ground.ts';

export type GroundKind = NonNullable<GroundAnswer['ground']>['kind'];

/** Points with levels in the scheme's grid: x, y and level of one after the other. */
export type Spots = { readonly kind: 'spots'; readonly points: Float64Array };

/** Levels of cells row by row from the north, NaN where there is none. */
export type Grid = {
  readonly kind: 'grid';
  readonly columns: number;
  readonly rows: number;
  /** The middle of the most south-western cell. */
  readonly west: number;
  readonly south: number;
  readonly width: number;
  readonly height: number;
  /** The grid's system, where it is not the scheme's. */
  readonly crs: number | null;
  readonly levels: Float32Array;
};

/** The ground of a scheme: one level, points or a grid. */
export type Ground = { readonly kind: 'level'; readonly level: number } | Spots | Grid;

/** A level that was read; `isNearest` where a point lies outside of all triangles. */
export type Sample = { readonly level: number; readonly isNearest: boolean };

/** Reads levels at points of the scheme's grid; null where there is none. */
export type Sampler = (point: readonly [number, number]) => Sample | null;

/** How many points or cells with a level there are, and between which levels. */
export function groundFacts(ground: Ground): { points: number; lowest: number; highest: number } {
  if (ground.kind === 'level') return { points: 1, lowest: ground.level, highest: ground.level };
  let [points, lowest, highest] = [0, Infinity, -Infinity];
  const [from, step, list] =
    ground.kind === 'grid' ? ([0, 1, ground.levels] as const) : ([2, 3, ground.points] as const);
  for (let k = from; k < list.length; k += step) {
    const level = list[k] ?? NaN;
    if (Number.isNaN(level)) continue;
    points += 1;
    lowest = Math.min(lowest, level);
    highest = Math.max(highest, level);
  }
  return { points, lowest, highest };
}
