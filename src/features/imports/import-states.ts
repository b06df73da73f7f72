import type { ImportAnswer } from '../../../shared/schemas/imports.ts';
import type { State } from '../../components/ui/state-mark.tsx';

type ImportState = ImportAnswer['state'];

/** How far an import is, by word and mark. */
export const IMPORT_STATE_WORDS: Readonly<
  Record<ImportState, { readonly words: string; readonly mark: State }>
> = {
  reading: { words: 'Reading', mark: 'in-hand' },
  checking: { words: 'Checking', mark: 'in-hand' },
  asking: { words: 'Waiting for you', mark: 'waiting' },
  importing: { words: 'Bringing in', mark: 'in-hand' },
  done: { words: 'Brought in', mark: 'done' },
  cancelled: { words: 'Cancelled', mark: 'not-started' },
  failed: { words: 'Did not work', mark: 'not-started' },
};

/** Whether the server is at it, so that it is worth asking again. */
export function isWorking(state: ImportState): boolean {
  return state === 'reading' || state === 'checking' || state === 'importing';
}

/** Whether the person may still choose. */
export function isOpen(state: ImportState): boolean {
  return state === 'reading' || state === 'checking' || state === 'asking';
}
