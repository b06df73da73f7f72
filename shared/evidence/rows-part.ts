import {
  lineHeight,
  printSize,
  wordsPart,
  type ColumnPart,
  type ColumnPen,
} from './column-part.ts';
import { lineMark, type Mark } from './marks.ts';
import { fitted } from './wrapped.ts';

/**
 * A column of a small table: its heading, how wide it is as a share of the whole, and how it is set.
 *
 * Units: shares of the width. Valid: shares of a table add up to 1. Source: [own].
 */
export type SmallColumn = {
  readonly heading: string;
  readonly share: number;
  readonly isFigure?: boolean;
};

const SIZE = 7.5;

function cells(
  { width, scale, measure }: ColumnPen,
  columns: readonly SmallColumn[],
  values: readonly string[],
  { size: asked, isStrong }: { readonly size: number; readonly isStrong: boolean },
): ColumnPart {
  const size = printSize(asked, scale);
  const height = lineHeight(size) + 1.2;
  return {
    height,
    marks: ([x, y]) => {
      let left = x;
      const words = columns.map(({ share, isFigure = false }, k): Mark => {
        const wide = share * width;
        const text = fitted(values[k] ?? '', wide - 1.5, measure, { size, isStrong });
        const at = isFigure ? left + wide : left;
        left += wide;
        return {
          ...{ kind: 'words', words: text, at: [at, y + height - 1.6], size, isStrong },
          anchor: isFigure ? 'end' : 'start',
        };
      });
      const foot = y + height - 0.3;
      return [...words, lineMark([[x, foot], [x + width, foot]], { ink: 'hairline', width: 0.15 })]; // prettier-ignore
    },
  };
}

/**
 * A small table with a title: a heading row, then rows one under the other.
 *
 * Units: mm. Valid: as many values in a row as columns; what is too long is cut with an ellipsis.
 * Source: [own].
 */
export function tableParts(
  pen: ColumnPen,
  title: string,
  columns: readonly SmallColumn[],
  rows: readonly (readonly string[])[],
): ColumnPart[] {
  return [
    wordsPart(pen, title, { size: 9.5, isStrong: true }),
    cells(
      pen,
      columns,
      columns.map(({ heading }) => heading),
      { size: 7, isStrong: false },
    ),
    ...rows.map((row) => cells(pen, columns, row, { size: SIZE, isStrong: false })),
  ];
}

/**
 * Notes with their numbers under a title.
 *
 * Units: mm. Valid: any notes. Source: [own].
 */
export function noteParts(pen: ColumnPen, notes: readonly string[]): ColumnPart[] {
  const indent = 4.6 * pen.scale;
  return [
    wordsPart(pen, 'Notes', { size: 9.5, isStrong: true }),
    ...notes.map((note, k): ColumnPart => {
      const words = wordsPart(pen, note, { size: 7.2, indent });
      const number = wordsPart(pen, `${k + 1}.`, { size: 7.2 });
      return {
        height: words.height + 0.5,
        marks: (at) => [...number.marks(at), ...words.marks(at)],
      };
    }),
  ];
}
