import { CAUTIONS } from '../../../shared/cautions.ts';
import { beside, stack, type Block } from '../pdf/block.ts';
import type { Paper } from '../pdf/paper.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import { SHEET_WIDTH } from './sheet-width.ts';
import { titled } from './titled.ts';

/** What goes on every sheet. */
export function cautionsBlock(paper: Paper): Block {
  const rows = CAUTIONS.map((caution) =>
    beside([
      { at: 0, block: wordsBlock(paper, '•', 8, { size: 8.5 }) },
      { at: 9, block: wordsBlock(paper, caution, SHEET_WIDTH - 9, { size: 8.5 }) },
    ]),
  );
  return titled(paper, { title: 'Cautions' }, SHEET_WIDTH, stack(rows, 1.5));
}
