import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import type { PartyImport } from '../../../shared/schemas/party-imports.ts';
import { Page } from '../../components/layout/page.tsx';
import { ButtonLink } from '../../components/ui/button-link.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { ownersPath, partyImportsPath } from '../../config/paths.ts';
import { formatMoment } from '../../lib/format-date.ts';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { useChangePartyImport } from './api/change-party-import.ts';
import { partyImportQuery, type RowsOnly } from './api/party-imports.ts';
import { PartyImportColumns } from './components/party-import-columns.tsx';
import { PartyImportCounts } from './components/party-import-counts.tsx';
import { PartyImportRows } from './components/party-import-rows.tsx';
import { TakeOverBar } from './components/take-over-bar.tsx';

const STATES: Readonly<Record<PartyImport['state'], string>> = {
  checked: 'Checked. Nothing is written yet.',
  'taken over': 'Taken over.',
  'given up': 'Given up. Nothing of it was written, and the file is forgotten.',
};

function Ended({ answer }: { readonly answer: PartyImport }) {
  const scheme = useScheme();
  return (
    <div className="mt-3 mb-5 flex flex-wrap gap-2">
      <ButtonLink kind="main" to={ownersPath(scheme.id, 'parties')}>
        See the parties
      </ButtonLink>
      {answer.counts.problem > 0 && (
        <ButtonLink to={partyImportsPath(scheme.id)}>Bring in what was left out</ButtonLink>
      )}
    </div>
  );
}

function Desk({ answer }: { readonly answer: PartyImport }) {
  const scheme = useScheme();
  const [only, setOnly] = useState<RowsOnly | null>(answer.counts.problem > 0 ? 'problem' : null);
  const changes = useChangePartyImport(scheme.id, answer.id);
  const { state, counts } = answer;
  const mayChange = state === 'checked' && can(scheme, 'updateParties');
  return (
    <>
      <PartyImportCounts counts={counts} only={only} onChoose={setOnly} />
      {mayChange && <TakeOverBar {...{ answer, changes }} />}
      {state !== 'checked' && <Ended answer={answer} />}
      <div className="mt-5 grid grid-cols-[minmax(0,1fr)_360px] gap-x-8 max-lg:block">
        <div className="min-w-0">
          {state !== 'given up' && <PartyImportRows {...{ answer, only }} />}
        </div>
        {mayChange && (
          <div className="min-w-0 max-lg:mt-5">
            <PartyImportColumns
              key={JSON.stringify(answer.columns)}
              answer={answer}
              busy={changes.check.isPending}
              onCheck={(columns) => {
                changes.check.mutate(columns);
              }}
            />
          </div>
        )}
      </div>
    </>
  );
}

/** One import of parties: what it comes to row by row, and whether it is taken over. */
export function PartyImportPage() {
  const scheme = useScheme();
  const { partyImportId = '' } = useParams();
  const { data, error, refetch } = useQuery(partyImportQuery(scheme.id, partyImportId));
  if (data === undefined) {
    return (
      <Page title="Bring in parties">
        {error === null ? (
          <LoadingRows what="the import" />
        ) : (
          <QueryError what="The import" error={error} onRetry={() => void refetch()} />
        )}
      </Page>
    );
  }
  const { fileName, by, sentAt, state } = data;
  return (
    <Page
      title="Bring in parties"
      lead={
        <span className="break-words">
          {`${fileName}, sent by ${by}, ${formatMoment(sentAt)}. ${STATES[state]}`}
        </span>
      }
    >
      <Desk answer={data} />
    </Page>
  );
}
