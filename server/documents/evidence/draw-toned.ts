import { lookOfTone, TONE_EDGE, TONE_TILE } from '../../../shared/evidence/look-of-tone.ts';
import { overlap, type Mark, type Rectangle, type Spot } from '../../../shared/evidence/marks.ts';
import { HATCH_TILE } from '../../../shared/presentation/damage-style.ts';
import { fillCategory } from '../pdf/hatch.ts';
import type { Paper } from '../pdf/paper.ts';
import { trace } from '../pdf/trace.ts';

type Toned = Extract<Mark, { kind: 'toned' }>;

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

/** Fills rings as their tone is drawn everywhere, and draws their edge; hatched no further than is seen. */
export function drawToned(paper: Paper, { tone, rings }: Toned, seen: Rectangle): void {
  const { doc } = paper;
  const shape = () => {
    for (const ring of rings) trace(paper, ring, true);
  };
  const { category, fill, edge } = lookOfTone(tone);
  if (category === null) {
    shape();
    doc.fill(fill, 'even-odd');
  } else {
    const bounds = overlap(boundsOf(rings), seen);
    fillCategory(paper, category, shape, bounds, TONE_TILE / HATCH_TILE);
  }
  shape();
  doc.lineWidth(TONE_EDGE).lineJoin('round').strokeColor(edge).stroke();
}
