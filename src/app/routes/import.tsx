import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Content } from '../../components/layout/content.tsx';
import { PageTitle } from '../../components/layout/page-title.tsx';
import { ErrorNote } from '../../components/ui/error-note.tsx';
import { LoadingRows } from '../../components/ui/loading-rows.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { isRefusal } from '../../lib/api-error.ts';
import { can } from '../../features/schemes/can.ts';
import { useScheme } from '../../features/schemes/scheme-context.ts';
import { importQuery } from '../../features/imports/api/get-import.ts';
import { ImportDesk } from '../../features/imports/components/import-desk.tsx';
import { NoSuchImport } from '../../features/imports/components/no-such-import.tsx';

/** One import of a scheme. */
import { NotFoundPage } from './not-found.tsx';
function Import() {
  const scheme = useScheme();
  const { importId = '' } = useParams();
  const { data: answer, error, refetch } = useQuery(importQuery(scheme.id, importId));
  const isMissing = isRefusal(error, 'not-found', 'invalid-input');
  return (
    <Content className="flex flex-col overflow-hidden max-md:overflow-auto">
      <PageTitle>{answer === undefined ? 'Import' : `Import of ${answer.fileName}`}</PageTitle>
      {answer !== undefined && error !== null && !isMissing && (
        <ErrorNote
          failed="The server does not answer."
          stands="This page is as it last was. It goes on once the server is back."
        />
      )}
      {answer !== undefined && !isMissing && <ImportDesk key={answer.id} answer={answer} />}
      {isMissing && <NoSuchImport />}
      {answer === undefined && !isMissing && (
        <div className="p-8 max-sm:p-4">
          <h1 className="sr-only">Import</h1>
          {error === null ? (
            <LoadingRows what="the import" />
          ) : (
            <QueryError what="The import" error={error} onRetry={() => void refetch()} />
          )}
        </div>
      )}
    </Content>
  );
}

/** For who may change the register. */
export function ImportPage() {
  return can(useScheme(), 'updateRegister') ? (
    <Import />
  ) : (
    <Content>
      <NotFoundPage />
    </Content>
  );
}
