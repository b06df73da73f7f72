import { formatCount } from '../presentation/format-number.ts';
import type { PlannedSheet } from './planned-sheets.ts';
import type { AboutSheets } from './sheet.ts';
import type { TitleBlock } from './title-part.ts';

const KINDS = {
  plan: 'Plan',
  'long section': 'Long section',
  'cross sections': 'Sections',
} as const;

/** The scale of a sheet; one of several scales says them in its notes. */
function scaleOf({ what }: PlannedSheet): string {
  if (what.kind !== 'plan' && what.exaggeration !== 1) return 'As noted';
  return `1 : ${formatCount(what.kind === 'plan' ? what.frame.denominator : what.denominator)}`;
}

/**
 * The title block of a sheet, its fields as they were written and the rest from the run and the sheet.
 *
 * Units: none. Valid: any sheet; `list` says which of the sheets behind it one is.
 * Source: iso-title-blocks-2004.
 */
export function titleOfSheet(
  planned: PlannedSheet,
  { scheme, run, fields }: AboutSheets,
  list: string,
): TitleBlock {
  const { number, of, layout, what } = planned;
  return {
    owner: scheme.name,
    title: fields.title,
    subtitle: fields.subtitle,
    number: fields.number,
    revision: fields.revisions[0]?.revision ?? '',
    sheet: `${number} of ${of}`,
    scale: scaleOf(planned),
    paper: layout.paper,
    kind: KINDS[what.kind],
    ...{ prepared: fields.prepared, checked: fields.checked, approved: fields.approved },
    issued: fields.issued,
    run: String(run.number),
    list,
  };
}
