import { beside, stack, type Block } from './block.ts';
import type { Flow } from './flow.ts';
import { INKS } from './inks.ts';
import type { Paper } from './paper.ts';
import { drawLine } from './trace.ts';
import { wordsBlock, type Align } from './words-block.ts';
import type { Words } from './words.ts';

/** A column of a table; its words are wrapped to its width. */
export type TableColumn = {
  readonly heading: Words;
  readonly width: number;
  readonly align?: Align;
};

/** A row, cell by cell; a marked one lies on a wash with clay at its left. */
export type TableRow = { readonly cells: readonly Words[]; readonly isMarked?: boolean };

type TableOptions = { readonly size?: number };

const [SIZE, HEADING_SIZE] = [8, 7];
const PAD = 2.2;
/** Between columns. */
export const BETWEEN_COLUMNS = 8;

function widthOf(columns: readonly TableColumn[]): number {
  return columns.reduce((sum, { width }) => sum + width + BETWEEN_COLUMNS, -BETWEEN_COLUMNS);
}

function cells(
  paper: Paper,
  columns: readonly TableColumn[],
  words: readonly Words[],
  look: { size: number; ink?: string },
): Block {
  let at = 0;
  const blocks = columns.map(({ width, align = 'left' }, k) => {
    const block = wordsBlock(paper, words[k] ?? '', width, { ...look, align });
    const placed = { at, block };
    at += width + BETWEEN_COLUMNS;
    return placed;
  });
  return beside(blocks);
}

function ruled(
  paper: Paper,
  inner: Block,
  width: number,
  rule: { ink: string; thickness: number; isMarked?: boolean },
): Block {
  const height = inner.height + 2 * PAD;
  return {
    height,
    draw: (x, y) => {
      if (rule.isMarked === true) {
        paper.doc.rect(x - 4, y, width + 8, height).fill(INKS.clayWash);
        paper.doc.rect(x - 4, y, 2, height).fill(INKS.clay);
      }
      inner.draw(x, y + PAD);
      drawLine(paper, [[x, y + height], [x + width, y + height]], { ink: rule.ink, width: rule.thickness }); // prettier-ignore
    },
  };
}

function headOf(paper: Paper, columns: readonly TableColumn[]): Block {
  const words = columns.map(({ heading }) => heading);
  const inner = cells(paper, columns, words, { size: HEADING_SIZE, ink: INKS.second });
  return ruled(paper, inner, widthOf(columns), { ink: INKS.ink, thickness: 0.6 });
}

function rowOf(
  paper: Paper,
  columns: readonly TableColumn[],
  { cells: words, isMarked = false }: TableRow,
  { size = SIZE }: TableOptions,
): Block {
  const inner = cells(paper, columns, words, { size });
  return ruled(paper, inner, widthOf(columns), { ink: INKS.hairline, thickness: 0.5, isMarked });
}

/** A small table that stays on one page. */
export function tableBlock(
  paper: Paper,
  columns: readonly TableColumn[],
  rows: readonly TableRow[],
  options: TableOptions = {},
): Block {
  return stack([headOf(paper, columns), ...rows.map((row) => rowOf(paper, columns, row, options))]);
}

/**
 * Begins a table that may go on over pages, with its heads on each; a row is never cut. What it gives puts
 * the next row.
 */
export function beginTable(
  flow: Flow,
  paper: Paper,
  columns: readonly TableColumn[],
  options: TableOptions = {},
): (row: TableRow) => void {
  const head = headOf(paper, columns);
  let isHeaded = false;
  return (row) => {
    const block = rowOf(paper, columns, row, options);
    const needed = block.height + (isHeaded ? 0 : head.height);
    if (!flow.hasRoom(needed)) {
      flow.turn();
      isHeaded = false;
    }
    if (!isHeaded) flow.put(head);
    isHeaded = true;
    flow.put(block);
  };
}

/** A table that may go on over pages, with all its rows. */
export function flowTable(
  flow: Flow,
  paper: Paper,
  columns: readonly TableColumn[],
  rows: readonly TableRow[],
  options: TableOptions = {},
): void {
  rows.forEach(beginTable(flow, paper, columns, options));
}
