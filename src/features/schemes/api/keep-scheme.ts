import type { QueryClient } from '@tanstack/react-query';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { waitingQuery } from '../../waiting/api/get-waiting.ts';
import { schemeQuery } from './get-scheme.ts';
import { schemesQuery } from './list-schemes.ts';

/** Puts a scheme as the server has just answered it in place of what was there. */
export function keepScheme(client: QueryClient, scheme: SchemeAnswer): void {
  client.setQueryData(schemeQuery(scheme.id).queryKey, scheme);
  void client.invalidateQueries({ queryKey: schemesQuery.queryKey, exact: true });
  void client.invalidateQueries({ queryKey: waitingQuery.queryKey });
}
