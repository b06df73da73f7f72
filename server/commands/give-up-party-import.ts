import { endPartyImport, type FoundPartyImport } from '../models/party-imports.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readPartyImport, takeStagedTable } from './check-party-import.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Gives an import up; what its file held is forgotten. */
export async function giveUpPartyImport(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  id: string,
): Promise<FoundPartyImport> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    await takeStagedTable(database, scheme.id, id, transaction);
    await endPartyImport(database, id, null, transaction);
    const subject = { kind: 'party import', id };
    const change = { by, schemeId: scheme.id, action: 'give up party import', subject };
    await recordChange(change, transaction);
    return readPartyImport(database, scheme.id, id, transaction);
  });
}
