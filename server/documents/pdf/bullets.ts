import { beside, stack, type Block } from './block.ts';
import type { Paper } from './paper.ts';
import { wordsBlock } from './words-block.ts';
import type { Look } from './words.ts';

type BulletLook = Look & {
  /** From the left of a point to its words. */
  readonly indent: number;
  readonly between: number;
};

/** A list, each item with its point. */
export function bullets(
  paper: Paper,
  items: readonly string[],
  width: number,
  { indent, between, ...look }: BulletLook,
): Block {
  const rows = items.map((item) =>
    beside([
      { at: 0, block: wordsBlock(paper, '•', indent, look) },
      { at: indent, block: wordsBlock(paper, item, width - indent, look) },
    ]),
  );
  return stack(rows, between);
}
