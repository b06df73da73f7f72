import { useQuery } from '@tanstack/react-query';
import { Outlet, useParams } from 'react-router-dom';
import { Content } from '../components/layout/content.tsx';
import { QueryError } from '../components/ui/query-error.tsx';
import { schemeQuery } from '../features/schemes/api/get-scheme.ts';
import { SchemeContext } from '../features/schemes/scheme-context.ts';
import { isRefusal } from '../lib/api-error.ts';
import { NotFoundPage } from './routes/not-found.tsx';
import { TopBar } from './top-bar.tsx';

/** The pages of a scheme, each under the bar; they lay out what is below it themselves. */
export function SchemeFrame() {
  const { schemeId = '' } = useParams();
  const { data: scheme, error, refetch } = useQuery(schemeQuery(schemeId));
  // the bar stays the same one when the scheme arrives: a menu may be open in it
  return (
    <SchemeContext value={scheme ?? null}>
      <TopBar scheme={scheme} />
      {scheme !== undefined ? (
        <Outlet />
      ) : (
        <Content>
          {isRefusal(error, 'not-found') && <NotFoundPage />}
          {error !== null && !isRefusal(error, 'not-found') && (
            <div className="p-8">
              <QueryError what="The scheme" error={error} onRetry={() => void refetch()} />
            </div>
          )}
        </Content>
      )}
    </SchemeContext>
  );
}
