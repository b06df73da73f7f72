import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { classNames } from '../../../lib/class-names.ts';
import type { Marks } from '../hooks/use-marks.ts';
import { DoneLine, type Done } from './done-line.tsx';
import { MarkedActions } from './marked-actions.tsx';

type RegisterFootProps = {
  readonly schemeId: string;
  /** The run whose results are shown; null where none is complete. */
  readonly runId: string | null;
  readonly marks: Marks;
  readonly mayEdit: boolean;
  readonly done: Done | null;
  readonly onDone: (done: Done | null) => void;
};

const KEYS = [
  { keys: ['J', 'K'], does: 'move' },
  { keys: ['X'], does: 'mark' },
  { keys: ['Enter'], does: 'open' },
  { keys: ['P'], does: 'show on plan' },
] as const;

function Keys({ mayEdit }: { readonly mayEdit: boolean }) {
  return (
    <p className="ml-auto flex items-center gap-3 text-cap text-ink-2 max-xl:hidden">
      {KEYS.filter(({ does }) => mayEdit || does !== 'mark').map(({ keys, does }) => (
        <span key={does} className="flex items-center gap-1">
          {keys.map((key) => (
            <KeyCap key={key}>{key}</KeyCap>
          ))}{' '}
          {does}
        </span>
      ))}
    </p>
  );
}

/** Under the table: what is marked, what was done last, and the keys. */
export function RegisterFoot(props: RegisterFootProps) {
  const { schemeId, runId, marks, mayEdit, done, onDone } = props;
  const hasMarks = mayEdit && marks.count > 0;
  return (
    <div
      className={classNames(
        'flex min-h-9 flex-none flex-wrap items-center gap-x-5 gap-y-1 border-t border-ink bg-paper-raised px-4 py-1 print:hidden',
        !hasMarks && done === null && 'max-xl:hidden',
      )}
    >
      {hasMarks && <MarkedActions {...{ schemeId, runId, marks, onDone }} />}
      {done !== null && <DoneLine key={done.words} {...{ schemeId, done, onDone }} />}
      <Keys mayEdit={mayEdit} />
    </div>
  );
}
