import { useState } from 'react';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { Button } from '../../../components/ui/button.tsx';
import { CheckDialog } from '../../decisions/components/check-dialog.tsx';
import { DecideDialog } from '../../decisions/components/decide-dialog.tsx';
import { GiveDialog } from '../../decisions/components/give-dialog.tsx';
import type { Marks } from '../hooks/use-marks.ts';
import { BulkDialog } from './bulk-dialog.tsx';
import type { Done } from './done-line.tsx';
import { RemoveDialog } from './remove-dialog.tsx';

type MarkedActionsProps = {
  readonly schemeId: string;
  /** The run whose results are shown; null where none is complete. */
  readonly runId: string | null;
  readonly marks: Marks;
  readonly onDone: (done: Done) => void;
};

const ACTIONS = {
  decide: 'Decide…',
  check: 'Check…',
  give: 'Give to an assessor…',
  values: 'Set values…',
  removal: 'Remove…',
} as const;

type Action = keyof typeof ACTIONS;

const ALL: readonly Action[] = ['decide', 'check', 'give', 'values', 'removal'];
/** Nothing is decided before anything is worked out. */
const WITHOUT_RUN: readonly Action[] = ['give', 'values', 'removal'];

type AskedProps = MarkedActionsProps & { readonly asks: Action; readonly onClose: () => void };

/** What is asked before it is done to all that is marked. */
function Asked({ asks, runId, ...ask }: AskedProps) {
  const { marks, onDone } = ask;
  function tell(words: string) {
    onDone({ words, changeIds: [] });
  }
  function clearAndTell(done: Done) {
    marks.clear();
    onDone(done);
  }
  switch (asks) {
    case 'decide':
      return runId === null ? null : <DecideDialog {...{ ...ask, runId }} onDone={tell} />;
    case 'check':
      return <CheckDialog {...ask} onDone={tell} />;
    case 'give':
      return <GiveDialog {...ask} onDone={tell} />;
    case 'values':
      return <BulkDialog {...ask} />;
    case 'removal':
      return <RemoveDialog {...ask} onDone={clearAndTell} />;
  }
}

/** What can be done with what is marked. */
export function MarkedActions(props: MarkedActionsProps) {
  const { runId, marks } = props;
  const [asks, setAsks] = useState<Action | null>(null);
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
      {(runId === null ? WITHOUT_RUN : ALL).map((action) => (
        <Button
          key={action}
          kind="quiet"
          onClick={() => {
            setAsks(action);
          }}
        >
          {ACTIONS[action]}
        </Button>
      ))}
      <Button kind="quiet" onClick={marks.clear}>
        Unmark
      </Button>
      {asks !== null && (
        <Asked
          {...props}
          asks={asks}
          onClose={() => {
            setAsks(null);
          }}
        />
      )}
    </div>
  );
}
