import { useQuery } from '@tanstack/react-query';
import { Outlet, useParams } from 'react-router-dom';
import { QueryError } from '../components/ui/query-error.tsx';
import { schemeQuery } from '../features/schemes/api/get-scheme.ts';
import { SchemeContext } from '../features/schemes/scheme-context.ts';
import { isRefusal } from '../lib/api-error.ts';
import { Framed } from './framed.tsx';
import { NotFoundPage } from './routes/not-found.tsx';
import { TopBar } from './top-bar.tsx';

/** The pages of a scheme, each under the bar; they lay out what is below it themselves. */
export function SchemeFrame() {
  const { schemeId = '' } = useParams();
  const { data: scheme, error, refetch } = useQuery(schemeQuery(schemeId));
  if (scheme !== undefined) {
    return (
      <SchemeContext value={scheme}>
        <TopBar scheme={scheme} />
        <Outlet />
      </SchemeContext>
    );
  }
  return (
    <Framed>
      {isRefusal(error, 'not-found') && <NotFoundPage />}
      {error !== null && !isRefusal(error, 'not-found') && (
        <div className="p-8">
          <QueryError what="The scheme" error={error} onRetry={() => void refetch()} />
        </div>
      )}
    </Framed>
  );
}
