import { useState } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { classNames } from '../../../lib/class-names.ts';
import { formatCount } from '../../../lib/format-number.ts';
import type { Marks } from '../hooks/use-marks.ts';
import { BulkDialog } from './bulk-dialog.tsx';
import { DoneLine, type Done } from './done-line.tsx';
import { RemoveDialog } from './remove-dialog.tsx';

type RegisterFootProps = {
  readonly schemeId: string;
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

type MarkedProps = Omit<RegisterFootProps, 'mayEdit' | 'done'>;

/** What can be done with what is marked. */
function Marked({ schemeId, marks, onDone }: MarkedProps) {
  const [asks, setAsks] = useState<'values' | 'removal' | null>(null);
  const ask = { schemeId, marks, onDone };
  function close() {
    setAsks(null);
  }
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1 text-small">
      <span>
        <b className="font-semibold">{formatCount(marks.count)}</b>
        {' marked'}
        {marks.isAll && (
          <span className="max-sm:sr-only">
            , all that are found{marks.letGo > 0 && ` but ${formatCount(marks.letGo)}`}
          </span>
        )}
      </span>
      {marks.isFull && (
        <span role="status" className="text-ink-2">
          No more one by one: filter, then mark all that are found.
        </span>
      )}
      <Button
        kind="quiet"
        onClick={() => {
          setAsks('values');
        }}
      >
        Set values…
      </Button>
      <Button
        kind="quiet"
        onClick={() => {
          setAsks('removal');
        }}
      >
        Remove…
      </Button>
      <Button kind="quiet" onClick={marks.clear}>
        Unmark
      </Button>
      {asks === 'values' && <BulkDialog {...ask} onClose={close} />}
      {asks === 'removal' && (
        <RemoveDialog
          {...ask}
          onClose={close}
          onDone={(done) => {
            marks.clear();
            onDone(done);
          }}
        />
      )}
    </div>
  );
}

/** Under the table: what is marked, what was done last, and the keys. */
export function RegisterFoot({ schemeId, marks, mayEdit, done, onDone }: RegisterFootProps) {
  const hasMarks = mayEdit && marks.count > 0;
  return (
    <div
      className={classNames(
        'flex min-h-9 flex-none flex-wrap items-center gap-x-5 gap-y-1 border-t border-ink bg-paper-raised px-4 py-1 print:hidden',
        !hasMarks && done === null && 'max-xl:hidden',
      )}
    >
      {hasMarks && <Marked {...{ schemeId, marks, onDone }} />}
      {done !== null && <DoneLine key={done.words} {...{ schemeId, done, onDone }} />}
      <Keys mayEdit={mayEdit} />
    </div>
  );
}
