import type { ColumnPart, ColumnPen } from './column-part.ts';
import { continuedSheets } from './continued-sheets.ts';
import { frameMarks } from './plan-signs.ts';
import type { PlannedSheet } from './planned-sheets.ts';
import { columnMarks } from './sheet-column.ts';
import type { AboutSheets, Sheet } from './sheet.ts';
import { titleOfSheet } from './title-of-sheet.ts';

/**
 * The sheets behind a sheet that hold what found no room in its column.
 *
 * Units: mm. Valid: none where nothing is left. Source: [own].
 */
export function sheetsBehind(
  { name, width, height }: Sheet,
  { planned, about, pen }: Readonly<{ planned: PlannedSheet; about: AboutSheets; pen: ColumnPen }>,
  parts: readonly ColumnPart[],
): Sheet[] {
  const { layout } = planned;
  const frame = frameMarks(layout.frame, layout.window, layout.column);
  return continuedSheets(layout.window, pen, parts).map((more, k, { length }) => {
    const title = titleOfSheet(planned, about, `${k + 1} of ${length}`);
    const foot = columnMarks(layout, pen, { always: [], asRoom: [], title });
    const marks = [...frame, ...more, ...foot.marks];
    return { name: `${name}, list ${k + 1}`, width, height, marks };
  });
}
