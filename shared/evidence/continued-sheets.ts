import type { ColumnPart, ColumnPen } from './column-part.ts';
import { boxMark, type Mark, type Rectangle } from './marks.ts';

/** Between columns of words on a sheet of lists, in mm. */
const BETWEEN = 8;

/**
 * Lays parts out over as many sheets as they need, in columns of a pen's width.
 *
 * Units: mm. Valid: a part that is higher than a column stands alone in one. Source: [own].
 */
export function continuedSheets(
  window: Rectangle,
  pen: ColumnPen,
  parts: readonly ColumnPart[],
): Mark[][] {
  const count = Math.max(
    1,
    Math.floor((window.right - window.left + BETWEEN) / (pen.width + BETWEEN)),
  );
  const sheets: Mark[][] = [];
  let [column, y] = [count, window.bottom];
  for (const part of parts) {
    if (column >= count || y + part.height > window.bottom) {
      column += 1;
      y = window.top;
    }
    if (column >= count) {
      sheets.push([boxMark(window, { stroke: { ink: 'ink', width: 0.35 } })]);
      column = 0;
    }
    const x = window.left + BETWEEN / 2 + column * (pen.width + BETWEEN);
    sheets.at(-1)?.push(...part.marks([x, y + 2]));
    y += part.height;
  }
  return sheets;
}
