import { Navigate } from 'react-router-dom';
import { useScheme } from '../features/schemes/scheme-context.ts';
import { schemeLinks } from './destinations.ts';
import { PATHS } from '../config/paths.ts';

/** Opens a scheme at the first of its screens that the person may see. */
export function SchemeStart() {
  const [first] = schemeLinks(useScheme());
  return <Navigate replace to={first?.to ?? PATHS.schemes} />;
}
