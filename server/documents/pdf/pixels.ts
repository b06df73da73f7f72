import type { Block } from './block.ts';
import type { Paper } from './paper.ts';

/** Points in a pixel of a drawing: as large on paper as browsers print it. */
export const POINTS_PER_PIXEL = 0.75;

/** A drawing in pixels, as the screen has it, on a page. */
export function pixelBlock({ doc }: Paper, height: number, draw: () => void): Block {
  return {
    height: height * POINTS_PER_PIXEL,
    draw: (x, y) => {
      doc.save().translate(x, y).scale(POINTS_PER_PIXEL);
      draw();
      doc.restore();
    },
  };
}
