import type { Block } from './block.ts';
import type { Paper } from './paper.ts';
import { wrapWords } from './wrap-words.ts';
import { writeLine, type Look, type Words } from './words.ts';

export type Align = 'left' | 'right' | 'centre';

const LEADING = 1.32;
/** From the top of a line to where its letters stand, as a share of its height. */
const STAND = 0.78;
const SHARES = { left: 0, centre: 0.5, right: 1 } as const;

/** Words wrapped to a width. */
export function wordsBlock(
  paper: Paper,
  words: Words,
  width: number,
  look: Look & { readonly align?: Align },
): Block {
  const lines = wrapWords(paper, words, look, width);
  const each = look.size * LEADING;
  return {
    height: lines.length * each,
    draw: (x, y) => {
      for (const [k, line] of lines.entries()) {
        const aside = SHARES[look.align ?? 'left'] * (width - line.width);
        writeLine(paper, line, x + aside, y + (k + STAND) * each);
      }
    },
  };
}
