import { PATHS } from '../../../config/paths.ts';
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

/** The address of a what-if, to be sent to somebody. */
export function whatIfPath(draft: WhatIfDraft): string {
  const search = new URLSearchParams();
  for (const name of WHAT_IF_NAMES) {
    const { name: short, start } = WHAT_IF_FIELDS[name];
    if (draft[name] !== start) search.set(short, draft[name]);
  }
  const words = search.toString();
  return words === '' ? PATHS.whatIf : `${PATHS.whatIf}?${words}`;
}
