import { INKS } from './inks.ts';
import type { Paper } from './paper.ts';
import { lineOf, writeLine, type Look, type Words } from './words.ts';

type LabelOptions = Look & {
  readonly anchor?: 'start' | 'middle' | 'end';
  /** Whether what lies under the words is covered with paper. */
  readonly onPaper?: boolean;
};

const SHARES = { start: 0, middle: 0.5, end: 1 } as const;
const COVER = 2;

/** Words in a drawing; `y` is where the letters stand. */
export function label(paper: Paper, words: Words, x: number, y: number, look: LabelOptions): void {
  const line = lineOf(paper, words, look);
  const left = x - SHARES[look.anchor ?? 'start'] * line.width;
  if (look.onPaper === true) {
    const top = y - look.size * 0.82;
    const [width, height] = [line.width + 2 * COVER, look.size * 1.1];
    paper.doc.rect(left - COVER, top, width, height).fill(INKS.paper);
  }
  writeLine(paper, line, left, y);
}
