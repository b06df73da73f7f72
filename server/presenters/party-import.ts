import { partyImportSchema, type PartyImport } from '../../shared/schemas/party-imports.ts';
import type { FoundPartyImport } from '../models/party-imports.ts';

/** What leaves the server of an import of parties; its rows are asked for by page. */
export function presentPartyImport(found: FoundPartyImport): PartyImport {
  return partyImportSchema.parse({
    id: found.id,
    fileName: found.fileName,
    state: found.state,
    fileColumns: found.fileColumns,
    columns: found.columns,
    counts: found.counts,
    by: found.by,
    sentAt: found.sentAt.toISOString(),
    endedAt: found.endedAt?.toISOString() ?? null,
  });
}
