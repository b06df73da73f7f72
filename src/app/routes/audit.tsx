import { useInfiniteQuery, useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { Page } from '../../components/layout/page.tsx';
import { Button } from '../../components/ui/button.tsx';
import { EmptyState } from '../../components/ui/empty-state.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { Select } from '../../components/ui/select.tsx';
import { auditQuery } from '../../features/audit/api/list-audit.ts';
import { AuditTable } from '../../features/audit/components/audit-table.tsx';
import { schemesQuery } from '../../features/schemes/api/list-schemes.ts';
import { formatCount } from '../../../shared/presentation/format-number.ts';

type SchemeFilterProps = {
  readonly value: string;
  readonly onChange: (schemeId: string) => void;
};

function SchemeFilter({ value, onChange }: SchemeFilterProps) {
  const { data: schemes = [] } = useQuery(schemesQuery);
  return (
    <Select
      label="Scheme"
      frameClassName="mb-3 w-[280px] max-w-full"
      unchosen="All, and what belongs to none"
      value={value}
      options={schemes.map(({ id, name }) => ({ value: id, label: name }))}
      onChange={({ target }) => {
        onChange(target.value);
      }}
    />
  );
}

function Entries({ schemeId }: { readonly schemeId: string }) {
  const audit = useInfiniteQuery(auditQuery(schemeId));
  const { data, error, refetch, hasNextPage, isFetchingNextPage, fetchNextPage } = audit;
  if (data === undefined) {
    if (error === null) return <LoadingRows what="the audit trail" />;
    return <QueryError what="The audit trail" error={error} onRetry={() => void refetch()} />;
  }
  const entries = data.pages.flatMap((page) => page.entries);
  if (entries.length === 0) return <EmptyState>Nothing has been changed yet.</EmptyState>;
  return (
    <>
      <AuditTable entries={entries} />
      <div className="mt-3 flex items-center gap-3">
        {hasNextPage && (
          <Button busy={isFetchingNextPage} onClick={() => void fetchNextPage()}>
            Show older
          </Button>
        )}
        <span role="status" className="text-small text-ink-2">
          {formatCount(entries.length)} shown{hasNextPage ? '' : ', to the first one'}.
        </span>
      </div>
      {error !== null && (
        <QueryError what="Older entries" error={error} onRetry={() => void fetchNextPage()} />
      )}
    </>
  );
}

export function AuditPage() {
  const [search, setSearch] = useSearchParams();
  const schemeId = search.get('scheme') ?? '';
  return (
    <Page
      title="Audit"
      lead="Who changed what, when, from which values to which. Nothing here can be changed."
    >
      <SchemeFilter
        value={schemeId}
        onChange={(id) => {
          setSearch(id === '' ? {} : { scheme: id }, { replace: true });
        }}
      />
      <Entries key={schemeId} schemeId={schemeId} />
    </Page>
  );
}
