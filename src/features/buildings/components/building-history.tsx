import { useQuery } from '@tanstack/react-query';
import type { BuildingHistory as History } from '../../../../shared/schemas/register-changes.ts';
import { Button } from '../../../components/ui/button.tsx';
import { LoadingRows } from '../../../components/ui/loading-rows.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { ValueChanges } from '../../../components/ui/value-changes.tsx';
import { formatMoment } from '../../../lib/format-date.ts';
import { buildingHistoryQuery } from '../api/get-history.ts';
import { useUndoChanges } from '../api/undo-changes.ts';
import { doneWords, valueChanges } from '../history-words.ts';

type EntryProps = {
  readonly entry: History[number];
  readonly busy: boolean;
  readonly onUndo: () => void;
};

function Entry({ entry, busy, onUndo }: EntryProps) {
  const { at, by, mayUndo } = entry;
  const changes = valueChanges(entry);
  const words = doneWords(entry);
  return (
    <li className="border-b border-hairline py-2 text-small">
      <div className="flex flex-wrap items-baseline gap-x-2">
        <time dateTime={at} className="text-ink-3">
          {formatMoment(at)}
        </time>
        <b className="font-semibold">{by ?? 'Groundsill'}</b>
        {mayUndo && (
          <Button kind="quiet" busy={busy} className="ml-auto h-6" onClick={onUndo}>
            {entry.kind === 'undo' ? 'Redo' : 'Undo'}
          </Button>
        )}
      </div>
      <p className="text-ink-2">{words.charAt(0).toUpperCase() + words.slice(1)}</p>
      {changes.length > 0 && (
        <div className="mt-1">
          <ValueChanges label={`Changed on ${formatMoment(at)}`} changes={changes} />
        </div>
      )}
    </li>
  );
}

type BuildingHistoryProps = { readonly schemeId: string; readonly buildingId: number };

/** Who changed what of a building, when, from which values to which. */
export function BuildingHistory({ schemeId, buildingId }: BuildingHistoryProps) {
  const { data, error, refetch } = useQuery(buildingHistoryQuery(schemeId, buildingId));
  const undo = useUndoChanges(schemeId);
  if (error !== null) {
    return <QueryError what="The history" error={error} onRetry={() => void refetch()} />;
  }
  if (data === undefined) return <LoadingRows what="the history" rows={4} />;
  if (data.length === 0) return <p className="mt-3 text-small text-ink-2">Nothing changed yet.</p>;
  return (
    <>
      <MutationError failed="It was not undone." error={undo.error} />
      <ol className="mt-2.5 border-t-2 border-ink">
        {data.map((entry) => (
          <Entry
            key={entry.changeId}
            entry={entry}
            busy={undo.isPending}
            onUndo={() => {
              undo.mutate([entry.changeId]);
            }}
          />
        ))}
      </ol>
    </>
  );
}
