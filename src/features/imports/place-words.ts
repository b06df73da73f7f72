import type { ImportAnswer } from '../../../shared/schemas/imports.ts';

type PlaceFound = NonNullable<ImportAnswer['place']>;

/** Who says which system a file's coordinates are in. */
export const SAID_BY: Readonly<Record<PlaceFound['from'], string>> = {
  'the file': 'The file says so',
  'the format': 'Files of this kind always are',
  'the person': 'You picked it',
  nobody: 'Nobody has said it yet',
};

/** How far a footprint may be off for want of knowledge about two datums. */
export function accuracyInWords(accuracy: number | null): string {
  if (accuracy === null) return 'not known';
  if (accuracy === 0) return 'nothing is lost';
  return `up to ${accuracy} m off`;
}
