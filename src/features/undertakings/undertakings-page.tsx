import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { Undertaking } from '../../../shared/schemas/undertakings.ts';
import { PageTitle } from '../../components/layout/page-title.tsx';
import { Button } from '../../components/ui/button.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { can } from '../schemes/can.ts';
import { useScheme } from '../schemes/scheme-context.ts';
import { undertakingsQuery } from './api/list-undertakings.ts';
import { UndertakingDialog } from './components/undertaking-dialog.tsx';
import { UndertakingTable } from './components/undertaking-table.tsx';

type Asked = Undertaking | 'new' | null;

function UndertakingList({
  onChange,
}: {
  onChange: ((undertaking: Undertaking) => void) | undefined;
}) {
  // prettier-ignore
  const scheme = useScheme();
  const { data, error, refetch } = useQuery(undertakingsQuery(scheme.id));
  if (error !== null) {
    return <QueryError what="The undertakings" error={error} onRetry={() => void refetch()} />;
  }
  if (data === undefined) return <LoadingRows what="the undertakings" />;
  if (data.length === 0) {
    return (
      <EmptyState>
        No undertakings yet. What has been promised to owners, authorities and neighbours stands
        here, by when it is due, and what shows that it is done.
      </EmptyState>
    );
  }
  return <UndertakingTable schemeId={scheme.id} undertakings={data} onChange={onChange} />;
}

/** What was promised to whom, overdue first. */
export function UndertakingsPage() {
  const scheme = useScheme();
  const [asked, setAsked] = useState<Asked>(null);
  const mayChange = can(scheme, 'updateUndertakings');
  return (
    <div className="p-8 max-sm:p-4">
      <PageTitle>{`Undertakings of ${scheme.name}`}</PageTitle>
      <div className="mb-3 flex flex-wrap items-center justify-between gap-3">
        <h1 className="text-h3">Undertakings</h1>
        {mayChange && (
          <Button
            onClick={() => {
              setAsked('new');
            }}
          >
            Add one…
          </Button>
        )}
      </div>
      {can(scheme, 'readUndertakings') ? (
        <UndertakingList onChange={mayChange ? setAsked : undefined} />
      ) : (
        <EmptyState>Undertakings are for those who work on the scheme.</EmptyState>
      )}
      {asked !== null && (
        <UndertakingDialog
          schemeId={scheme.id}
          undertaking={asked === 'new' ? null : asked}
          onClose={() => {
            setAsked(null);
          }}
        />
      )}
    </div>
  );
}
