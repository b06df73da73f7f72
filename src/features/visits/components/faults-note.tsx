import { useEffect, useRef } from 'react';
import { ErrorNote } from '../../../components/ui/error-note.tsx';

type FaultsNoteProps = {
  /** What keeps the visit from being recorded. */
  readonly faults: readonly string[];
  /** What this phone cannot do. */
  readonly stands: string | null;
};

/** Why the visit is not recorded yet; it takes the focus, for the button may be far from what is wrong. */
export function FaultsNote({ faults, stands }: FaultsNoteProps) {
  const note = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (faults.length > 0) note.current?.focus();
  }, [faults]);
  return (
    <div className="mt-4 grid gap-2">
      {stands !== null && <ErrorNote failed={stands} />}
      {faults.length > 0 && (
        <ErrorNote
          ref={note}
          failed="Not recorded yet."
          stands={faults.length > 1 ? undefined : faults[0]}
          action={
            faults.length > 1 ? (
              <ul className="list-disc pl-4">
                {faults.map((fault) => (
                  <li key={fault}>{fault}</li>
                ))}
              </ul>
            ) : undefined
          }
        />
      )}
    </div>
  );
}
