import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import type { BatchDetail } from '../../../shared/schemas/letter-batches.ts';
import { capital } from '../../../shared/presentation/capital.ts';
import { NotFoundPage } from '../../app/routes/not-found.tsx';
import { Page } from '../../components/layout/page.tsx';
import { Facts } from '../../components/ui/facts.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { StateMark } from '../../components/ui/state-mark.tsx';
import { formatMoment } from '../../lib/format-date.ts';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { batchQuery } from './api/letter-batches.ts';
import { BatchSteps } from './components/batch-steps.tsx';
import { LettersTable } from './components/letters-table.tsx';
import { BATCH_SHAPES, deliveryWords, KIND_LABELS, lettersWords } from './letter-words.ts';

function who(at: string | null, by: string | null): string {
  return at === null || by === null ? '' : `${formatMoment(at)}, ${by}`;
}

function templateWords({ templateVersion }: BatchDetail['batch']): string {
  return templateVersion === 0 ? 'first template' : `template version ${templateVersion}`;
}

function BatchFacts({ batch, text }: Pick<BatchDetail, 'batch' | 'text'>) {
  const { state, preparedAt, preparedBy, checkedAt, checkedBy, sentAt, sentBy, comment } = batch;
  const { settingsVersion, runNumber, printedAt } = batch;
  const basis = [
    runNumber === null ? 'no run' : `run ${runNumber}`,
    text !== null ? 'a text of its own' : templateWords(batch),
    settingsVersion === 0 ? 'first settings' : `settings version ${settingsVersion}`,
  ];
  const lines: (readonly [string, string])[] = [
    ['Written from', basis.join(', ')],
    ['Prepared', who(preparedAt, preparedBy)],
    [state === 'returned' ? 'Returned' : 'Checked', who(checkedAt, checkedBy)],
    ['Comment', comment ?? ''],
    ['Sent', who(sentAt, sentBy)],
    ['Printed', printedAt === null ? '' : formatMoment(printedAt)],
    ['How far', deliveryWords(batch)],
  ];
  return (
    <div className="max-w-[720px]">
      <Facts
        facts={[
          [
            'Stands',
            <StateMark key="state" state={BATCH_SHAPES[state]}>
              {capital(state)}
            </StateMark>,
          ],
          ...lines.filter(([, value]) => value !== ''),
        ]}
      />
    </div>
  );
}

/** How many letters go to somebody who had one like it. */
function hadWords({ sentAt }: BatchDetail['batch'], count: number): string {
  const had = 'had a letter of this kind for the same building before';
  const waits = sentAt === null ? ', or have it waiting in another batch' : '';
  return `${lettersWords(count)} of these ${count === 1 ? 'goes' : 'go'} to owners who ${had}${waits}.`;
}

type ExceptionsProps = {
  readonly title: string;
  readonly note: string;
  readonly exceptions: BatchDetail['chosen'];
};

/** Who gets a letter, or none, by somebody's hand, each with the reason. */
function Exceptions({ title, note, exceptions }: ExceptionsProps) {
  if (exceptions.length === 0) return null;
  return (
    <Panel title={title} note={note}>
      <ul className="text-small">
        {exceptions.map(({ name, why }) => (
          <li
            key={`${name} ${why}`}
            className="border-b border-hairline py-1 break-words last:border-0"
          >
            <b className="font-semibold">{name}</b> {why}
          </li>
        ))}
      </ul>
    </Panel>
  );
}

function WholeBatch({ batchId }: { readonly batchId: string }) {
  const scheme = useScheme();
  const { data, error, refetch } = useQuery(batchQuery(scheme.id, batchId));
  if (data === undefined) {
    return (
      <Page title="Letters">
        {error === null ? (
          <LoadingRows what="the letters" />
        ) : (
          <QueryError what="The letters" error={error} onRetry={() => void refetch()} />
        )}
      </Page>
    );
  }
  const { batch, text, letters, earlier, leftOut, chosen } = data;
  return (
    <Page
      title={`${KIND_LABELS[batch.kind]}: ${lettersWords(batch.letters)}, batch ${batch.number}`}
    >
      <BatchFacts batch={batch} text={text} />
      <BatchSteps batch={batch} />
      {text !== null && (
        <Panel title="Written for these letters" note="with its marks">
          <p className="mt-2 max-w-[62ch] text-body font-semibold break-words">{text.subject}</p>
          <p className="mt-2 max-w-[62ch] text-body break-words whitespace-pre-line">{text.body}</p>
        </Panel>
      )}
      <Panel title="Letters" note="each opens as it will be read">
        {earlier.length > 0 && <p className="my-2 text-body">{hadWords(batch, earlier.length)}</p>}
        <LettersTable label="Letters of the batch" {...{ letters, earlier }} />
      </Panel>
      <Exceptions title="Left out" note="although a rule names them" exceptions={leftOut} />
      <Exceptions title="Chosen by hand" note="although no rule names them" exceptions={chosen} />
    </Page>
  );
}

/** One batch of letters, from its check to its last acknowledgement. */
export function BatchPage() {
  const { batchId = '' } = useParams();
  return can(useScheme(), 'readLetters') ? <WholeBatch batchId={batchId} /> : <NotFoundPage />;
}
