import { CATEGORIES, type Category } from '../../../shared/damage/categories.ts';
import type { Mark, Rectangle, Spot, Tone } from '../../../shared/evidence/marks.ts';
import { DAMAGE, HATCH_TILE } from '../../../shared/presentation/damage-style.ts';
import { SETTLEMENT_TINTS, STAGE_TINTS } from '../../../shared/presentation/ground-tints.ts';
import { fillCategory } from '../pdf/hatch.ts';
import { INKS } from '../pdf/inks.ts';
import type { Paper } from '../pdf/paper.ts';
import { trace } from '../pdf/trace.ts';

type Toned = Extract<Mark, { kind: 'toned' }>;

/** The side of a tile of hatch on paper, in millimetres, and of a pixel of it. */
const TILE = 2.1;
const PIXEL = TILE / HATCH_TILE;
const EDGE = 0.18;

/** The least rectangle round rings. */
export function boundsOf(rings: readonly (readonly Spot[])[]): Rectangle {
  let [left, top, right, bottom] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const ring of rings) {
    for (const [x, y] of ring) {
      left = Math.min(left, x);
      right = Math.max(right, x);
      top = Math.min(top, y);
      bottom = Math.max(bottom, y);
    }
  }
  return { left, top, right, bottom };
}

function categoryOf({ by, number }: Tone): Category | undefined {
  if (by !== 'category') return undefined;
  return CATEGORIES.find(({ category }) => category === number)?.category;
}

function tintOf({ by, number }: Tone): string {
  const tints = by === 'stage' ? STAGE_TINTS : SETTLEMENT_TINTS;
  return tints.find(([of]) => of === number)?.[1] ?? INKS.paper;
}

/** Fills rings as their tone is drawn everywhere, and draws their edge; hatched no further than is seen. */
export function drawToned(paper: Paper, { tone, rings }: Toned, seen: Rectangle): void {
  const { doc } = paper;
  const shape = () => {
    for (const ring of rings) trace(paper, ring, true);
  };
  const category = categoryOf(tone);
  const own = boundsOf(rings);
  const bounds = {
    left: Math.max(own.left, seen.left),
    top: Math.max(own.top, seen.top),
    right: Math.min(own.right, seen.right),
    bottom: Math.min(own.bottom, seen.bottom),
  };
  if (category === undefined) {
    shape();
    doc.fill(tintOf(tone), 'even-odd');
  } else fillCategory(paper, category, shape, bounds, PIXEL);
  shape();
  const edge = category === undefined ? INKS.bandLine : DAMAGE[category].edge;
  doc.lineWidth(EDGE).lineJoin('round').strokeColor(edge).stroke();
}
