import { Outlet } from 'react-router-dom';
import { usePerson } from '../features/session/person-context.ts';
import { NotFoundPage } from './routes/not-found.tsx';

/** The administrator's pages; for anyone else they are not there. */
export function AdministratorsOnly() {
  return usePerson().isAdministrator ? <Outlet /> : <NotFoundPage />;
}
