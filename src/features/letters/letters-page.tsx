import { useQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { capital } from '../../../shared/presentation/capital.ts';
import type { Batch } from '../../../shared/schemas/letter-batches.ts';
import { Page } from '../../components/layout/page.tsx';
import { ButtonLink } from '../../components/ui/button-link.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { StateMark } from '../../components/ui/state-mark.tsx';
import type { Column } from '../../components/ui/table/column.ts';
import { Table } from '../../components/ui/table/table.tsx';
import { letterPagePath } from '../../config/paths.ts';
import { formatShortDay } from '../../lib/format-date.ts';
import { NotFoundPage } from '../../app/routes/not-found.tsx';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { batchesQuery } from './api/letter-batches.ts';
import { lateLettersQuery } from './api/letters.ts';
import { LettersTable } from './components/letters-table.tsx';
import { BATCH_SHAPES, deliveryWords, KIND_LABELS } from './letter-words.ts';

const COLUMNS: readonly Column<Batch>[] = [
  { id: 'number', heading: 'Batch', width: 60, cell: ({ number }) => number },
  { id: 'kind', heading: 'Kind', width: 210, cell: ({ kind }) => KIND_LABELS[kind] },
  {
    id: 'letters',
    heading: 'Letters',
    holds: 'figure',
    width: 76,
    cell: ({ letters }) => letters.toLocaleString('en-GB'),
  },
  {
    id: 'state',
    heading: 'Stands',
    width: 150,
    cell: ({ state }) => <StateMark state={BATCH_SHAPES[state]}>{capital(state)}</StateMark>,
  },
  {
    id: 'prepared',
    heading: 'Prepared',
    width: 220,
    spare: true,
    cell: ({ preparedAt, preparedBy }) => `${formatShortDay(preparedAt)}, ${preparedBy}`,
  },
  { id: 'far', heading: 'How far', wide: true, spare: true, cell: deliveryWords },
];

function Batches() {
  const scheme = useScheme();
  const navigate = useNavigate();
  const { data, error, refetch } = useQuery(batchesQuery(scheme.id));
  if (error !== null && data === undefined) {
    return <QueryError what="The letters" error={error} onRetry={() => void refetch()} />;
  }
  if (data === undefined) return <LoadingRows what="the letters" />;
  if (data.length === 0) {
    return (
      <EmptyState>
        No letters yet. Bring the parties in first; then the rules say who gets which letter, and a
        second person checks it before anything is sent.
      </EmptyState>
    );
  }
  return (
    <Table
      label="Batches of letters"
      columns={COLUMNS}
      rows={data}
      idOf={({ id }) => id}
      onOpen={({ id }) => void navigate(letterPagePath(scheme.id, id))}
    />
  );
}

/** Who should have answered by now. */
function Late() {
  const { id } = useScheme();
  const { data: late = [] } = useQuery(lateLettersQuery(id, 'answer'));
  const { data: toCall = [] } = useQuery(lateLettersQuery(id, 'call'));
  const escalated = new Set(toCall.map((letter) => letter.id));
  const waiting = late.filter((letter) => !escalated.has(letter.id));
  return (
    <>
      {toCall.length > 0 && (
        <Panel title="Call or go" note="no answer for so long that a letter will not do">
          <LettersTable label="Letters to call about" letters={toCall} />
        </Panel>
      )}
      {waiting.length > 0 && (
        <Panel title="Without an answer" note="past their day; by e-mail they are reminded once">
          <LettersTable label="Letters without an answer" letters={waiting} />
        </Panel>
      )}
    </>
  );
}

/** What has been written to owners, and what waits. */
export function LettersPage() {
  const scheme = useScheme();
  if (!can(scheme, 'readLetters')) return <NotFoundPage />;
  return (
    <Page
      title="Letters"
      lead="Prepared by one person, checked by another, then sent. What was sent never changes."
    >
      <div className="mb-4 flex flex-wrap gap-2">
        {can(scheme, 'prepareLetters') && (
          <ButtonLink kind="main" to={letterPagePath(scheme.id, 'new')}>
            Prepare letters
          </ButtonLink>
        )}
        <ButtonLink to={letterPagePath(scheme.id, 'templates')}>What letters say</ButtonLink>
        <ButtonLink to={letterPagePath(scheme.id, 'settings')}>Who gets which</ButtonLink>
      </div>
      <Batches />
      <Late />
    </Page>
  );
}
