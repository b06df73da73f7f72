import type { ImportOptions } from '../../shared/schemas/imports.ts';
import { IMPORT_FIELDS } from '../../shared/schemas/imports.ts';
import { COLUMN_WORDS } from './column-words.ts';
import { guessByWords } from './guess-by-words.ts';

type Column = { readonly name: string; readonly filled: number };

/** Which column fills which field of the register, guessed by its name; empty columns fill none. */
export function guessColumns(columns: readonly Column[]): ImportOptions['columns'] {
  return guessByWords(columns, IMPORT_FIELDS, COLUMN_WORDS);
}
