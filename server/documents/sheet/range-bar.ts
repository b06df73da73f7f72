import { CATEGORIES } from '../../../shared/damage/categories.ts';
import type { Range } from '../../../shared/numerics/range.ts';
import { percentWords } from '../../../shared/presentation/bracket-words.ts';
import { linearScale } from '../../../shared/presentation/linear-scale.ts';
import { stack, type Block } from '../pdf/block.ts';
import { INKS } from '../pdf/inks.ts';
import { label } from '../pdf/label.ts';
import type { Paper } from '../pdf/paper.ts';
import { pixelBlock, POINTS_PER_PIXEL } from '../pdf/pixels.ts';
import { drawLine } from '../pdf/trace.ts';
import { wordsBlock } from '../pdf/words-block.ts';

const [HEIGHT, LEAST_SCALE] = [34, 0.002];

/** The strain from low to high with its central value, among the limits of the categories. */
export function rangeBar(paper: Paper, { low, central, high }: Range, width: number): Block {
  const most = Math.max(LEAST_SCALE, high * 1.1);
  const across = linearScale([0, most], [1, width - 1]);
  const limits = CATEGORIES.filter(
    ({ limitingStrain }) => limitingStrain > 0 && limitingStrain < most,
  );
  const bar = pixelBlock(paper, HEIGHT, () => {
    drawLine(paper, [[0, 11], [width, 11]], { ink: INKS.rule }); // prettier-ignore
    for (const { label: words, limitingStrain } of limits) {
      const x = across(limitingStrain);
      drawLine(paper, [[x, 3], [x, 20]], { ink: INKS.third }); // prettier-ignore
      label(paper, words, x, 31, { size: 10, ink: INKS.second, anchor: 'middle' });
    }
    const wide = Math.max(1, across(high) - across(low));
    paper.doc.lineWidth(1).rect(across(low), 6, wide, 10).fillAndStroke(INKS.band, INKS.bandLine);
    drawLine(paper, [[across(central), 3], [across(central), 19]], { ink: INKS.ink, width: 3 }); // prettier-ignore
  });
  const words = `Strain ${percentWords(low, 3)} to ${percentWords(high, 3)}, central ${percentWords(central, 3)}; ticks are where each category begins.`;
  return stack(
    [bar, wordsBlock(paper, words, width * POINTS_PER_PIXEL, { size: 7.5, ink: INKS.second })],
    1,
  );
}
