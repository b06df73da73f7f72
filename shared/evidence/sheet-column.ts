import type { TitleFields } from '../schemas/evidence.ts';
import { stacked, type ColumnPart, type ColumnPen } from './column-part.ts';
import { lineMark, type Mark, type Measure } from './marks.ts';
import type { SheetLayout } from './paper-sizes.ts';
import { tableParts } from './rows-part.ts';
import { titlePart, type TitleBlock } from './title-part.ts';

/** Between the sides of a column and its words, and between a rule and what stands under it, in mm. */
const [PAD, GAP] = [4.6, 2.6];

/**
 * The pen that writes the column of a sheet.
 *
 * Units: mm. Valid: any layout. Source: [own].
 */
export function columnPen({ column, scale }: SheetLayout, measure: Measure): ColumnPen {
  return { width: column.right - column.left - 2 * PAD, scale, measure };
}

/**
 * The revision table.
 *
 * Units: mm. Valid: none where there is no revision. Source: iso-title-blocks-2004.
 */
export function revisionPart(pen: ColumnPen, { revisions }: TitleFields): ColumnPart[] {
  if (revisions.length === 0) return [];
  const columns = [
    { heading: 'Rev', share: 0.09 },
    { heading: 'Date', share: 0.22 },
    { heading: 'Change', share: 0.41 },
    { heading: 'By', share: 0.14 },
    { heading: 'Checked', share: 0.14 },
  ];
  const rows = revisions.map(({ revision, date, change, by, checked }) => [
    revision,
    date,
    change,
    by,
    checked,
  ]);
  return [stacked(tableParts(pen, 'Revisions', columns, rows))];
}

/**
 * What a column holds: parts that always stand in it, parts that stand in it as long as there is room, the
 * first before the others, and the title block at its foot.
 *
 * Units: none. Valid: what always stands in it fits. Source: [own].
 */
export type ColumnContent = {
  readonly always: readonly ColumnPart[];
  readonly asRoom: readonly ColumnPart[];
  readonly title: TitleBlock;
};

/**
 * The column of a sheet, with the parts that found no room in it.
 *
 * Units: mm. Valid: any content. Source: [own].
 */
export function columnMarks(
  layout: SheetLayout,
  pen: ColumnPen,
  { always, asRoom, title }: ColumnContent,
): { readonly marks: Mark[]; readonly left: readonly ColumnPart[] } {
  const { left, right, top, bottom } = layout.column;
  const foot = titlePart(pen, title, PAD);
  const rule = (y: number) => lineMark([[left, y], [right, y]], { ink: 'ink', width: 0.35 }); // prettier-ignore
  const footTop = bottom - foot.height - GAP;
  const marks: Mark[] = [rule(footTop), ...foot.marks([left + PAD, footTop + GAP])];
  let y = top;
  const put = (part: ColumnPart) => {
    if (y > top) marks.push(rule(y));
    marks.push(...part.marks([left + PAD, y + GAP]));
    y += part.height + 2 * GAP;
  };
  for (const part of always) put(part);
  const over = asRoom.filter((part) => {
    const fits = y + part.height + 2 * GAP <= footTop;
    if (fits) put(part);
    return !fits;
  });
  return { marks, left: over };
}
