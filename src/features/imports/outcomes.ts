import type { ImportAnswer, ImportRow } from '../../../shared/schemas/imports.ts';

export type Outcome = ImportRow['outcome'];

/** What a report can be narrowed to: one outcome, or rows with a remark. */
export type RowFilter = Outcome | 'noted';

/** What becomes of a row, in words, as a figure is called and as one row is. */
export const OUTCOME_WORDS: Readonly<Record<RowFilter, { many: string; one: string }>> = {
  new: { many: 'new', one: 'New' },
  changed: { many: 'changed', one: 'Changed' },
  same: { many: 'as they are', one: 'As it is' },
  conflict: { many: 'to settle', one: 'To settle' },
  refused: { many: 'refused', one: 'Refused' },
  noted: { many: 'with remarks', one: 'With a remark' },
};

/** The outcomes as people read them: what changes first, what is left out last. */
export const OUTCOMES_IN_ORDER: readonly Outcome[] = [
  'new',
  'changed',
  'same',
  'conflict',
  'refused',
];

/** How many buildings a confirmed import writes. */
export function countToWrite(counts: NonNullable<ImportAnswer['counts']>): number {
  return counts.new + counts.changed + counts.conflict;
}
