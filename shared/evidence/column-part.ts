import type { Ink, Mark, Measure, Spot } from './marks.ts';
import { wrapped } from './wrapped.ts';

/**
 * A part of a sheet's column: how high it is, and its marks from where it begins.
 *
 * Units: mm. Valid: made for one width. Source: [own].
 */
export type ColumnPart = { readonly height: number; readonly marks: (at: Spot) => Mark[] };

/**
 * What parts of a column are made with: the width between its margins, the scale of its words, and how
 * wide words are.
 *
 * Units: mm. Valid: any. Source: [own].
 */
export type ColumnPen = {
  readonly width: number;
  readonly scale: number;
  readonly measure: Measure;
};

/** A line of print is so many times as high as its letters; a point is so many mm. */
const LEADING = 1.34;
const MM_PER_POINT = 25.4 / 72;

/**
 * The height of a line of print.
 *
 * Units: size points of print, height mm. Valid: any size. Source: [own].
 */
export function lineHeight(size: number): number {
  return size * LEADING * MM_PER_POINT;
}

/** The least size of words on paper, in points of print. */
const LEAST = 6.5;

/**
 * A size of words on a sheet: that of A3 times the sheet's scale, never too small to read.
 *
 * Units: points of print. Valid: any size. Source: [own].
 */
export function printSize(asked: number, scale: number): number {
  return Math.max(LEAST, asked * scale);
}

type Look = {
  readonly size: number;
  readonly isStrong?: boolean;
  readonly ink?: Ink;
  readonly indent?: number;
};

/**
 * Words over as many lines as they need.
 *
 * Units: size points of print on A3, indent mm. Valid: any words. Source: [own].
 */
export function wordsPart(
  { width, scale, measure }: ColumnPen,
  words: string,
  { size: asked, isStrong = false, ink = 'ink', indent = 0 }: Look,
): ColumnPart {
  const size = printSize(asked, scale);
  const lines = wrapped(words, width - indent, measure, { size, isStrong });
  const each = lineHeight(size);
  return {
    height: lines.length * each,
    marks: ([x, y]) =>
      lines.map((line, k): Mark => ({
        ...{ kind: 'words', words: line, size, isStrong, ink },
        at: [x + indent, y + (k + 0.76) * each],
      })),
  };
}

/**
 * Parts one under the other.
 *
 * Units: mm. Valid: any parts. Source: [own].
 */
export function stacked(parts: readonly ColumnPart[], between = 0): ColumnPart {
  const height = parts.reduce((sum, part) => sum + part.height + between, -between);
  return {
    height: Math.max(0, height),
    marks: ([x, top]) => {
      let y = top;
      return parts.flatMap((part) => {
        const marks = part.marks([x, y]);
        y += part.height + between;
        return marks;
      });
    },
  };
}
