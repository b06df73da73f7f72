/** Something that can be put on a page at a place; its height is known before. */
export type Block = {
  readonly height: number;
  readonly draw: (x: number, y: number) => void;
};

/** Nothing, so high. */
export function gap(height: number): Block {
  return { height, draw: () => undefined };
}

/** Blocks one under the other. */
export function stack(blocks: readonly Block[], between = 0): Block {
  const height = blocks.reduce((sum, block) => sum + block.height + between, -between);
  return {
    height: Math.max(0, height),
    draw: (x, y) => {
      let top = y;
      for (const block of blocks) {
        block.draw(x, top);
        top += block.height + between;
      }
    },
  };
}

/** Blocks beside each other, each so far from the left. */
export function beside(blocks: readonly { readonly at: number; readonly block: Block }[]): Block {
  return {
    height: Math.max(0, ...blocks.map(({ block }) => block.height)),
    draw: (x, y) => {
      for (const { at, block } of blocks) block.draw(x + at, y);
    },
  };
}
