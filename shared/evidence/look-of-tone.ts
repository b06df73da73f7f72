import { CATEGORIES, type Category } from '../damage/categories.ts';
import { DAMAGE } from '../presentation/damage-style.ts';
import { SETTLEMENT_TINTS, STAGE_TINTS, type Tint } from '../presentation/ground-tints.ts';
import { INK_COLOURS } from './ink-colours.ts';
import type { Tone } from './marks.ts';

/**
 * The width of the edge round a toned shape, and the side of a tile of hatch.
 *
 * Units: mm of paper. Valid: read only. Source: [own].
 */
export const [TONE_EDGE, TONE_TILE] = [0.18, 2.1] as const;

/**
 * How a tone is drawn on paper and on the screen: as a category with its hatch, or in a plain colour, within
 * an edge.
 *
 * Units: colours as CSS writes them. Valid: `category` null where it is plain. Source: [own].
 */
export type ToneLook = {
  readonly category: Category | null;
  readonly fill: string;
  readonly edge: string;
};

const PLAIN_EDGE = '#53677c';

function plain(tints: readonly Tint[], number: number): ToneLook {
  const fill = tints.find(([one]) => one === number)?.[1] ?? INK_COLOURS.paper;
  return { category: null, fill, edge: PLAIN_EDGE };
}

/**
 * How a tone is drawn.
 *
 * Units: none. Valid: any tone; a number that is none of its list is plain paper. Source: [own].
 */
export function lookOfTone({ by, number }: Tone): ToneLook {
  if (by === 'stage') return plain(STAGE_TINTS, number);
  const category = CATEGORIES.find((one) => one.category === number)?.category;
  if (by === 'settlement' || category === undefined) return plain(SETTLEMENT_TINTS, number);
  const { fill, edge } = DAMAGE[category];
  return { category, fill, edge };
}
