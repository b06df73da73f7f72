import { stack, type Block } from '../pdf/block.ts';
import { INKS } from '../pdf/inks.ts';
import type { Paper } from '../pdf/paper.ts';
import { drawLine } from '../pdf/trace.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import type { Words } from '../pdf/words.ts';

const [TITLE, NOTE] = [9.5, 7.5];
const UNDER = 5;

type Title = { readonly title: Words; readonly note?: string };

/** The heading of a part: its title, in few words what it shows, and an ink line. */
export function heading(paper: Paper, { title, note = '' }: Title, width: number): Block {
  const words = typeof title === 'string' ? [{ text: title }] : title;
  const inner = stack([
    wordsBlock(paper, words, width, { size: TITLE, weight: 'strong' }),
    ...(note === '' ? [] : [wordsBlock(paper, note, width, { size: NOTE, ink: INKS.second })]),
  ]);
  return {
    height: inner.height + 2 + UNDER,
    draw: (x, y) => {
      inner.draw(x, y);
      const foot = y + inner.height + 2;
      drawLine(paper, [[x, foot], [x + width, foot]], { ink: INKS.ink, width: 0.9 }); // prettier-ignore
    },
  };
}

/** A part with its heading, kept together. */
export function titled(paper: Paper, title: Title, width: number, inner: Block): Block {
  return stack([heading(paper, title, width), inner]);
}
