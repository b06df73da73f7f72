import { CATEGORIES } from '../../../shared/damage/categories.ts';
import { beside, stack, type Block } from '../pdf/block.ts';
import { INKS } from '../pdf/inks.ts';
import type { Paper } from '../pdf/paper.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import { categorySwatch } from './category-swatch.ts';
import { percentFigure } from './figures.ts';

/** Every category with its hatch, its name and the strain from which it is reached. */
export function categoryKey(paper: Paper, width: number): Block {
  const rows = CATEGORIES.map(({ category, label, name, limitingStrain }) => {
    const from =
      limitingStrain === 0 ? 'under 0.050 %' : `from ${percentFigure(limitingStrain, 3)} %`;
    const words = stack([
      wordsBlock(paper, name, width - 58, { size: 8 }),
      wordsBlock(paper, from, width - 58, { size: 7, ink: INKS.second }),
    ]);
    return beside([
      { at: 0, block: categorySwatch(paper, category, { width: 36, height: 22 }) },
      { at: 33, block: wordsBlock(paper, label, 24, { size: 9, weight: 'strong' }) },
      { at: 58, block: words },
    ]);
  });
  return stack(rows, 2);
}
