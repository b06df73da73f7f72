import type { QueryClient } from '@tanstack/react-query';
import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { isRefusal } from '../../../lib/api-error.ts';
import { importQuery } from './get-import.ts';
import { importsQuery } from './list-imports.ts';

/** Puts an import as the server has just answered it in place of what was there. */
export function keepImport(client: QueryClient, schemeId: string, answer: ImportAnswer): void {
  client.setQueryData(importQuery(schemeId, answer.id).queryKey, answer);
  void client.invalidateQueries({ queryKey: importsQuery(schemeId).queryKey, exact: true });
}

/** Where somebody else was faster, shows what they did. */
export function fetchAfterConflict(
  client: QueryClient,
  schemeId: string,
  importId: string,
  error: Error,
): void {
  if (!isRefusal(error, 'conflict', 'not-found')) return;
  void client.invalidateQueries({ queryKey: importQuery(schemeId, importId).queryKey });
}
