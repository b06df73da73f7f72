import type { OpenedSamples } from '../../../shared/assessment/opened-samples.ts';
import { categoryLabel, settledWords } from '../../../shared/presentation/bracket-words.ts';
import {
  drawnFromWords,
  governingWords,
  SAMPLES_CAUTION,
  SAMPLES_PURPOSE,
  seedWords,
  shareWords,
} from '../../../shared/presentation/sample-words.ts';
import { beside, gap, stack, type Block } from '../pdf/block.ts';
import { INKS } from '../pdf/inks.ts';
import { label } from '../pdf/label.ts';
import type { Paper } from '../pdf/paper.ts';
import { pixelBlock, POINTS_PER_PIXEL } from '../pdf/pixels.ts';
import { tableBlock } from '../pdf/table.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import { drawSwatch } from './category-swatch.ts';
import { percentFigure } from './figures.ts';
import type { SheetParts } from './sheet-parts.ts';
import { SHEET_WIDTH } from './sheet-width.ts';
import { titled } from './titled.ts';
import type { WorkingPart } from './working-part.ts';

/** In pixels: the bars with their words, and what stands beside them. */
const [SHARES, BETWEEN] = [330, 24];
const [ROW, SWATCH, BAR_FROM, BAR_TO] = [24, 22, 62, 210];
const ASIDE = SHEET_WIDTH - (SHARES + BETWEEN) * POINTS_PER_PIXEL;

/** Each category with a bar as long as its share of the samples, in its hatch. */
function sharesBlock(paper: Paper, { categories }: OpenedSamples): Block {
  return pixelBlock(paper, categories.length * ROW, () => {
    for (const [row, { category, count, share }] of categories.entries()) {
      const [top, foot] = [row * ROW + 5, row * ROW + 17];
      drawSwatch(paper, category, { left: 0.5, top, right: SWATCH, bottom: foot });
      label(paper, categoryLabel(category), SWATCH + 7, foot - 1, { size: 11, weight: 'strong' });
      if (count > 0) {
        const right = BAR_FROM + Math.max(2, share * (BAR_TO - BAR_FROM));
        drawSwatch(paper, category, { left: BAR_FROM, top, right, bottom: foot });
      }
      label(paper, `${percentFigure(share, 1)} %`, 272, foot - 1, { size: 11, anchor: 'end' });
      label(paper, `${count}`, SHARES - 8, foot - 1, { size: 10, ink: INKS.second, anchor: 'end' });
    }
  });
}

function strainsBlock(paper: Paper, { strains }: OpenedSamples): Block {
  const width = (ASIDE - (strains.length - 1) * 8) / strains.length;
  const columns = strains.map((one) => ({
    heading: shareWords(one),
    width,
    align: 'right' as const,
  }));
  const row = { cells: strains.map(({ strain }) => percentFigure(strain, 3)) };
  const note = 'Strain in % that so many of the samples do not pass';
  return stack([
    wordsBlock(paper, note, ASIDE, { size: 7.5, ink: INKS.second }),
    tableBlock(paper, columns, [row]),
  ]);
}

/** How the likely inputs, drawn together many times, spread over the categories; null where nobody asked. */
export function samplesBlock({ paper, samples }: SheetParts): Block | null {
  if (samples === null) return null;
  const governs = governingWords(samples);
  const aside = stack(
    [
      strainsBlock(paper, samples),
      ...(governs === null ? [] : [wordsBlock(paper, governs, ASIDE, { size: 8.5 })]),
      wordsBlock(paper, settledWords(samples.sensitivity), ASIDE, { size: 8.5, weight: 'strong' }),
      wordsBlock(paper, SAMPLES_CAUTION, ASIDE, { size: 8.5 }),
    ],
    4,
  );
  const from = drawnFromWords(samples).map(([word, value]) => `${word}: ${value}`);
  const inner = stack([
    beside([
      { at: 0, block: sharesBlock(paper, samples) },
      { at: SHEET_WIDTH - ASIDE, block: aside },
    ]),
    gap(5),
    wordsBlock(paper, `${SAMPLES_PURPOSE} ${from.join('. ')}.`, SHEET_WIDTH, {
      size: 7.5,
      ink: INKS.second,
    }),
  ]);
  const note = `${seedWords(samples)}; the share of the samples in each category, and how many`;
  return titled(paper, { title: 'Sampled run', note }, SHEET_WIDTH, inner);
}

/** The working of the sample in the middle; none where nobody asked, or where nothing is strained in it. */
export function samplesWorking({ samples }: SheetParts): readonly WorkingPart[] {
  const middle = samples?.strains.find(({ share }) => share === 0.5);
  if (samples === null || middle === undefined || middle.working.length === 0) return [];
  const note = `the sample whose strain half of the samples do not pass; ${seedWords(samples)}`;
  return [{ title: 'Working of the sampled run', note, sections: middle.working }];
}
