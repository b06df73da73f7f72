import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { Content } from '../components/layout/content.tsx';
import { QueryError } from '../components/ui/query-error.tsx';
import { PATHS } from '../config/paths.ts';
import { sessionQuery } from '../features/session/api/get-session.ts';
import { PersonContext } from '../features/session/person-context.ts';

/** The pages for who is signed in; whoever is not is asked to, and then comes back. */
export function SignedIn() {
  const { pathname, search } = useLocation();
  const { data, error, refetch } = useQuery(sessionQuery);
  const person = useMemo(() => (data?.person ? { ...data.person, demo: data.demo } : null), [data]);
  if (person !== null) {
    return (
      <PersonContext value={person}>
        <Outlet />
      </PersonContext>
    );
  }
  if (data !== undefined) return <Navigate to={PATHS.signIn} replace state={pathname + search} />;
  if (error === null) return null;
  return (
    <Content className="p-8">
      <QueryError what="Who is signed in" error={error} onRetry={() => void refetch()} />
    </Content>
  );
}
