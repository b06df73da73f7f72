import type { Rectangle } from '../../shared/evidence/marks.ts';
import { greyPictureOfPdf } from './pdf-tools.ts';

/** A page as a copier without colours sees it: `at` is the grey of a pixel, from 0 black to 255 white. */
export type GreyCopy = {
  readonly pixelsPerMm: number;
  readonly at: (x: number, y: number) => number;
};

/** Renders the first page of a document in greys. */
export function greyCopy(pdf: Uint8Array, dotsPerInch: number): GreyCopy {
  const picture = greyPictureOfPdf(pdf, dotsPerInch);
  const head = /^P5\s(\d+)\s(\d+)\s255\s/.exec(picture.subarray(0, 40).toString('latin1'));
  if (head === null) throw new Error('This is no picture in greys.');
  const [{ length: begin }, wide] = [head[0], Number(head[1])];
  return {
    pixelsPerMm: dotsPerInch / 25.4,
    at: (x, y) => picture[begin + y * wide + x] ?? NaN,
  };
}

/**
 * What tells one patch of a copy from another: how light it is, and how much its grey changes from pixel to
 * pixel going up to the right and down to the right. Along its own strokes a hatch changes little.
 */
export type Texture = { readonly light: number; readonly rising: number; readonly falling: number };

/** The texture of a piece of paper, given in mm. */
export function textureOf({ pixelsPerMm, at }: GreyCopy, piece: Rectangle): Texture {
  const [left, top, right, bottom] = [piece.left, piece.top, piece.right, piece.bottom].map((mm) =>
    Math.round(mm * pixelsPerMm),
  ) as [number, number, number, number];
  let [count, light, rising, falling] = [0, 0, 0, 0];
  for (let y = top + 1; y < bottom - 1; y += 1) {
    for (let x = left; x < right - 1; x += 1) {
      const grey = at(x, y);
      count += 1;
      light += grey;
      rising += (at(x + 1, y - 1) - grey) ** 2;
      falling += (at(x + 1, y + 1) - grey) ** 2;
    }
  }
  return {
    light: light / count,
    rising: Math.sqrt(rising / count),
    falling: Math.sqrt(falling / count),
  };
}
