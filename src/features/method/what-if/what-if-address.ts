import { PATHS } from '../../../config/paths.ts';
import { leftOutOf, type LeftOut } from './left-out.ts';
import {
  forEachFigure,
  WHAT_IF_FIELDS,
  WHAT_IF_NAMES,
  type WhatIfDraft,
} from './what-if-fields.ts';

/** Longer texts in an address are no figures. */
const LONGEST = 20;

/** What an address puts into the fields; what it leaves out is as in the check. */
export function readDraft(search: URLSearchParams): WhatIfDraft {
  return forEachFigure((name) => {
    const { name: short, start } = WHAT_IF_FIELDS[name];
    return search.get(short)?.slice(0, LONGEST) ?? start;
  });
}

const SHEET = 'sheet';

/** What was left out of the wall of a sheet that the figures began with; null where they began with none. */
export function readLeftOut(search: URLSearchParams): readonly LeftOut[] | null {
  const names = search.get(SHEET);
  return names === null ? null : leftOutOf(names.split('.'));
}

/** The address of a what-if, to be sent to somebody. */
export function whatIfPath(draft: WhatIfDraft, leftOut: readonly LeftOut[] | null = null): string {
  const search = new URLSearchParams();
  for (const name of WHAT_IF_NAMES) {
    const { name: short, start } = WHAT_IF_FIELDS[name];
    if (draft[name] !== start) search.set(short, draft[name]);
  }
  if (leftOut !== null) search.set(SHEET, leftOut.join('.'));
  const words = search.toString();
  return words === '' ? PATHS.whatIf : `${PATHS.whatIf}?${words}`;
}
