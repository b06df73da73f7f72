import type { Category } from '../../../shared/damage/categories.ts';
import { DAMAGE } from '../../../shared/presentation/damage-style.ts';
import type { Block } from '../pdf/block.ts';
import { fillCategory } from '../pdf/hatch.ts';
import type { Paper } from '../pdf/paper.ts';
import { pixelBlock } from '../pdf/pixels.ts';

/** A piece of a category's hatch with its edge, so many pixels wide and high. */
export function categorySwatch(
  paper: Paper,
  category: Category,
  { width, height }: { readonly width: number; readonly height: number },
): Block {
  const { doc } = paper;
  return pixelBlock(paper, height, () => {
    const bounds = { left: 0, top: 0, right: width, bottom: height };
    fillCategory(paper, category, () => doc.rect(0, 0, width, height), bounds);
    doc.lineWidth(1).strokeColor(DAMAGE[category].edge).rect(0, 0, width, height).stroke();
  });
}
