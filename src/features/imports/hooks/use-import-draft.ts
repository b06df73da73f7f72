import { useState } from 'react';
import {
  importOptionsSchema,
  type ImportAnswer,
  type ImportOptions,
} from '../../../../shared/schemas/imports.ts';
import { useChangeImport } from '../api/change-import.ts';

/** What is chosen on the page, and whether the server has checked the file by it. */
export type ImportDraft = {
  readonly options: ImportOptions;
  /** Some of it has not been checked yet. */
  readonly isAhead: boolean;
  /** It can be sent as it is written. */
  readonly isSound: boolean;
  readonly isSending: boolean;
  readonly error: Error | null;
  /** Chooses and waits for more; the person checks when they are done. */
  readonly choose: (options: Partial<ImportOptions>) => void;
  /** Chooses and checks at once, where the server is free. */
  readonly chooseNow: (options: Partial<ImportOptions>) => void;
  readonly check: () => void;
  readonly takeBack: () => void;
};

/** A check that runs is given up for another; a file that is still being read is not. */
const TAKES_CHOICES: ReadonlySet<ImportAnswer['state']> = new Set(['asking', 'checking']);

function isSame(a: ImportOptions, b: ImportOptions): boolean {
  return JSON.stringify(a) === JSON.stringify(b);
}

/** Keeps what the person chooses until the file has been checked by it. */
export function useImportDraft(schemeId: string, answer: ImportAnswer): ImportDraft {
  const [chosen, setChosen] = useState<ImportOptions | null>(null);
  const change = useChangeImport(schemeId, answer.id);
  const options = chosen ?? answer.options;

  function send(next: ImportOptions): void {
    setChosen(next);
    if (!TAKES_CHOICES.has(answer.state) || change.isPending) return;
    if (!importOptionsSchema.safeParse(next).success) return;
    change.mutate(
      { version: answer.version, options: next },
      {
        onSuccess: () => {
          // what was chosen while it was on its way is kept
          setChosen((now) => (now === next ? null : now));
        },
      },
    );
  }
  return {
    options,
    isAhead: chosen !== null && !isSame(chosen, answer.options),
    isSound: importOptionsSchema.safeParse(options).success,
    isSending: change.isPending,
    error: change.error,
    choose: (some) => {
      setChosen({ ...options, ...some });
    },
    chooseNow: (some) => {
      send({ ...options, ...some });
    },
    check: () => {
      send(options);
    },
    takeBack: () => {
      setChosen(null);
      change.reset();
    },
  };
}
