import { BUILDING_FIELDS } from '../../../shared/schemas/building-fields.ts';
import type { CorrectedField } from '../../../shared/schemas/matters.ts';

/** A correction as it is being written. */
export type CorrectionDraft = { readonly field: CorrectedField; readonly value: string };

export const NO_CORRECTION: CorrectionDraft = { field: 'storeys', value: '' };

/** Numbers go as numbers; what is no number goes as it was typed, and is refused with a word why. */
export function suggestionOf({ field, value }: CorrectionDraft) {
  const number = Number(value);
  const isNumber = BUILDING_FIELDS[field].kind !== 'text' && value.trim() !== '';
  return { field, value: isNumber && Number.isFinite(number) ? number : value };
}
