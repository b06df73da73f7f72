import { suits } from './block-styles.ts';
import type { BlockStyle } from './block-styles.ts';
import { frameOf, fullness } from './frames.ts';
import { centroid, signedArea } from './polygons.ts';
import { distance } from './vector.ts';
import type { Point, Ring } from './vector.ts';

/** Blocks whose style is settled beforehand, so that the line passes every sort of building. */
const pins: readonly (readonly [BlockStyle, Point])[] = [
  ['office', [706, 478]], ['office', [930, 424]], ['office', [868, 520]], ['office', [690, 350]], ['office', [1010, 452]], ['office', [830, 372]], ['office', [560, 470]], ['office', [300, 460]],
  ['court', [762, 352]], ['court', [596, 330]], ['court', [930, 520]], ['court', [150, 388]], ['court', [470, 500]],
  ['flats', [64, 410]], ['flats', [990, 530]], ['flats', [60, 236]], ['flats', [620, 690]], ['flats', [1000, 330]], ['flats', [40, 300]],
  ['works', [110, 215]], ['stores', [214, 320]], ['stores', [150, 120]], ['stores', [512, 230]], ['stores', [226, 260]],
]; // prettier-ignore

/** Finds for each pin the nearest block that suits its style. */
export function pinStyles(
  blocks: readonly Ring[],
  taken: ReadonlySet<number>,
): Map<number, BlockStyle> {
  const pinned = new Map<number, BlockStyle>();
  const middles = blocks.map(centroid);
  for (const [style, near] of pins) {
    const ranked = [...blocks.entries()]
      .map(([index, block]) => ({ index, block, off: distance(middles[index] ?? near, near) }))
      .filter(({ index, off }) => off < 90 && !taken.has(index) && !pinned.has(index))
      .sort((a, b) => a.off - b.off);
    const best = ranked.find(
      ({ block }) => frameOf(block).short > 16 && suits(style, signedArea(block), fullness(block)),
    );
    if (best !== undefined) pinned.set(best.index, style);
  }
  return pinned;
}
