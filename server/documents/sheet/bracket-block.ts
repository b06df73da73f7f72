import {
  bracketCategories,
  LOSS_LEVELS,
  type Bracket,
} from '../../../shared/assessment/bracket.ts';
import { CATEGORIES, type Category } from '../../../shared/damage/categories.ts';
import {
  atPosition,
  CENTRAL,
  FIVE_POSITIONS,
  isRange,
  type FivePosition,
  type Range,
} from '../../../shared/numerics/range.ts';
import { percentWords } from '../../../shared/presentation/bracket-words.ts';
import type { Block } from '../pdf/block.ts';
import { fillCategory } from '../pdf/hatch.ts';
import { INKS } from '../pdf/inks.ts';
import { label } from '../pdf/label.ts';
import type { Paper } from '../pdf/paper.ts';
import { pixelBlock } from '../pdf/pixels.ts';
import { percentFigure } from './figures.ts';

type BracketOptions = {
  readonly bracket: Bracket;
  readonly volumeLoss: Range;
  /** Null where K is no input of the depth rule. */
  readonly troughWidth: Range | null;
  /** In pixels. */
  readonly width: number;
};

const [SIDE, HEAD, ROW, MOST] = [54, 16, 34, 120];
const [EDGE, GAP] = [5, 2];

/** The largest strain at one volume loss and K, whatever the E/G. */
function strainAt({ strains }: Bracket, v: number, k: number): number {
  return Math.max(...strains.map((levels) => levels[v]?.[k] ?? 0));
}

type Cell = { readonly category: Category; readonly strain: number; readonly isCentral: boolean };

function drawCell(
  paper: Paper,
  { category, strain, isCentral }: Cell,
  x: number,
  y: number,
  wide: number,
): void {
  const { doc } = paper;
  const [w, h] = [wide - 2 * GAP, ROW - 2 * GAP];
  const [left, top] = [x + GAP, y + GAP];
  const bounds = { left, top, right: left + w, bottom: top + h };
  fillCategory(paper, category, () => doc.rect(left, top, w, h), bounds);
  doc.rect(left + EDGE, top + EDGE, w - 2 * EDGE, h - 2 * EDGE).fill(INKS.paper);
  label(paper, CATEGORIES[category]?.label ?? '', left + EDGE + 3, top + h / 2 + 4, {
    size: 11,
    weight: 'strong',
  });
  label(paper, percentFigure(strain, 3), left + w - EDGE - 3, top + h / 2 + 4, {
    size: 10,
    anchor: 'end',
  });
  if (isCentral)
    doc
      .lineWidth(2)
      .strokeColor(INKS.ink)
      .rect(left - 1, top - 1, w + 2, h + 2)
      .stroke();
}

function drawHead(
  paper: Paper,
  troughWidth: Range,
  positions: readonly FivePosition[],
  wide: number,
): void {
  for (const [column, k] of positions.entries()) {
    const words = `${column === 0 ? 'K ' : ''}${atPosition(troughWidth, k).toFixed(2)}`;
    label(paper, words, SIDE + (column + 0.5) * wide, HEAD - 4, {
      size: 10,
      ink: INKS.second,
      anchor: 'middle',
    });
  }
}

/** Category and strain over the likely range: volume loss downwards, K across; the central one is framed. */
export function bracketBlock(
  paper: Paper,
  { bracket, volumeLoss, troughWidth, width }: BracketOptions,
): Block {
  const categories = bracketCategories(bracket);
  const varies = troughWidth !== null && isRange(troughWidth);
  const positions = varies ? FIVE_POSITIONS : [CENTRAL];
  const wide = Math.min(MOST, (width - SIDE) / positions.length);
  return pixelBlock(paper, HEAD + 3 * ROW, () => {
    if (troughWidth !== null) drawHead(paper, troughWidth, positions, wide);
    for (const [v, level] of LOSS_LEVELS.entries()) {
      const y = HEAD + v * ROW;
      label(paper, percentWords(volumeLoss[level], 2), 0, y + ROW / 2 + 4, {
        size: 10,
        ink: INKS.second,
      });
      for (const [column, k] of positions.entries()) {
        const isCentral = level === 'central' && k === CENTRAL;
        const cell = {
          category: categories[v]?.[k] ?? 0,
          strain: strainAt(bracket, v, k),
          isCentral,
        };
        drawCell(paper, cell, SIDE + column * wide, y, wide);
      }
    }
  });
}
