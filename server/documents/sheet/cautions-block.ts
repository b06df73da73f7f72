import { CAUTIONS } from '../../../shared/cautions.ts';
import type { Block } from '../pdf/block.ts';
import { bullets } from '../pdf/bullets.ts';
import type { Paper } from '../pdf/paper.ts';
import { SHEET_WIDTH } from './sheet-width.ts';
import { titled } from './titled.ts';

/** What goes on every sheet. */
export function cautionsBlock(paper: Paper): Block {
  const list = bullets(paper, CAUTIONS, SHEET_WIDTH, { size: 8.5, indent: 9, between: 1.5 });
  return titled(paper, { title: 'Cautions' }, SHEET_WIDTH, list);
}
