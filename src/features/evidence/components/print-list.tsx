import { useQuery } from '@tanstack/react-query';
import type { PrintAnswer } from '../../../../shared/schemas/evidence.ts';
import { Button } from '../../../components/ui/button.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { Progress } from '../../../components/ui/progress.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { formatMoment } from '../../../lib/format-date.ts';
import { isBeingMade, printFilePath, printsQuery, useCancelPrint } from '../api/prints.ts';
import { shortFingerprint, sizeWords } from '../evidence-words.ts';

type PrintProps = { readonly schemeId: string; readonly print: PrintAnswer };

function sheetsWords({ sheets }: PrintAnswer): string {
  return sheets === 1 ? '1 sheet' : `${sheets ?? 0} sheets`;
}

/** A print that is done: its file, how large it is, and its fingerprint. */
function Done({ schemeId, print }: PrintProps) {
  const { id, bytes, fingerprint } = print;
  return (
    <p className="flex flex-wrap gap-x-3 text-small">
      <a href={printFilePath(schemeId, id)} download className="font-semibold">
        Download PDF
      </a>
      <span className="text-ink-2">
        {sheetsWords(print)}, {sizeWords(bytes ?? 0)}
      </span>
      {fingerprint !== null && (
        <span className="text-ink-2" title={`SHA-256 ${fingerprint}`}>
          Fingerprint {shortFingerprint(fingerprint)}
        </span>
      )}
    </p>
  );
}

/** A print that is being made, with a way to stop it. */
function BeingMade({ schemeId, print }: PrintProps) {
  const cancel = useCancelPrint(schemeId);
  const stop = (
    <Button
      kind="quiet"
      busy={cancel.isPending}
      onClick={() => {
        cancel.mutate(print.id);
      }}
    >
      Cancel
    </Button>
  );
  return (
    <>
      {print.sheets === null ? (
        <p className="flex items-center gap-3 text-small">Waiting to be printed. {stop}</p>
      ) : (
        <Progress
          label="Printing"
          done={print.done}
          total={print.sheets}
          unit="sheets"
          onCancel={() => {
            if (!cancel.isPending) cancel.mutate(print.id);
          }}
        />
      )}
      <MutationError failed="The print was not stopped." error={cancel.error} />
    </>
  );
}

/** How a print fares: it is waited for, can be fetched, or says why there is nothing. */
function PrintState({ schemeId, print }: PrintProps) {
  if (print.state === 'done') return <Done {...{ schemeId, print }} />;
  if (isBeingMade(print)) return <BeingMade {...{ schemeId, print }} />;
  if (print.state === 'cancelled') return <p className="text-small text-ink-2">Stopped.</p>;
  return <p className="text-small text-clay-deep">{print.fault ?? 'It could not be printed.'}</p>;
}

/** A print that was asked for here, as it fares. */
export function AskedPrint({ schemeId, print }: PrintProps) {
  const { data } = useQuery(printsQuery(schemeId));
  const now = data?.find(({ id }) => id === print.id) ?? print;
  return (
    <div aria-live="polite">
      <PrintState {...{ schemeId }} print={now} />
    </div>
  );
}

/** The prints of a scheme, the newest first. */
export function PrintList({ schemeId }: { readonly schemeId: string }) {
  const { data, error, refetch } = useQuery(printsQuery(schemeId));
  if (error !== null && data === undefined) {
    return <QueryError what="The prints" error={error} onRetry={() => void refetch()} />;
  }
  if (data === undefined) return null;
  if (data.length === 0) return <EmptyState>Nothing has been printed yet.</EmptyState>;
  return (
    <ol aria-label="Prints">
      {data.map((print) => (
        <li key={print.id} className="grid gap-1 border-b border-hairline py-2">
          <p className="flex flex-wrap items-baseline gap-x-2 text-small">
            <b className="min-w-0 font-semibold break-words">{print.name}</b>
            <span className="text-cap text-ink-3">
              Print {print.number} of run {print.runNumber}, {formatMoment(print.askedAt)},{' '}
              {print.askedBy ?? 'somebody who has left'}
            </span>
          </p>
          <PrintState {...{ schemeId, print }} />
        </li>
      ))}
    </ol>
  );
}
