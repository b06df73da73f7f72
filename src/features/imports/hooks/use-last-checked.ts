import { useState } from 'react';
import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';

/** An import whose rows have been checked. */
export type CheckedImport = ImportAnswer & { readonly counts: NonNullable<ImportAnswer['counts']> };

function checkedOf(answer: ImportAnswer): CheckedImport | null {
  const { counts, state } = answer;
  return counts === null || state === 'reading' || state === 'checking'
    ? null
    : { ...answer, counts };
}

/**
 * The import as it was last checked: while it is checked again, its rows are half old and half new, and the
 * page goes on showing what was there before. Null until it has been checked once, or when it cannot be.
 */
export function useLastChecked(answer: ImportAnswer): CheckedImport | null {
  const [seen, setSeen] = useState<ImportAnswer>(answer);
  const [checked, setChecked] = useState(() => checkedOf(answer));
  if (seen !== answer) {
    setSeen(answer);
    if (answer.state !== 'checking') setChecked(checkedOf(answer));
  }
  return checked;
}
