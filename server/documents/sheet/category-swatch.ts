import type { Category } from '../../../shared/damage/categories.ts';
import { DAMAGE } from '../../../shared/presentation/damage-style.ts';
import type { Block } from '../pdf/block.ts';
import { fillCategory, type Bounds } from '../pdf/hatch.ts';
import type { Paper } from '../pdf/paper.ts';
import { pixelBlock } from '../pdf/pixels.ts';

/** A category's hatch with its edge. */
export function drawSwatch(paper: Paper, category: Category, bounds: Bounds): void {
  const { doc } = paper;
  const { left, top, right, bottom } = bounds;
  const [width, height] = [right - left, bottom - top];
  fillCategory(paper, category, () => doc.rect(left, top, width, height), bounds);
  doc.lineWidth(1).strokeColor(DAMAGE[category].edge).rect(left, top, width, height).stroke();
}

/** A piece of a category's hatch with its edge, so many pixels wide and high. */
export function categorySwatch(
  paper: Paper,
  category: Category,
  { width, height }: { readonly width: number; readonly height: number },
): Block {
  return pixelBlock(paper, height, () => {
    drawSwatch(paper, category, { left: 0, top: 0, right: width, bottom: height });
  });
}
