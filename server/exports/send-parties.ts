import type { z } from 'zod';
import { PARTY_COLUMN_WORDS, type PartyColumn } from '../../shared/schemas/party-imports.ts';
import type { partiesExportQuerySchema } from '../../shared/schemas/parties.ts';
import { findPartyRows, type PartyRow } from '../models/party-rows.ts';
import type { ExportColumn } from './export-file.ts';
import { aboutFile, sendFile, type FileCall } from './send-file.ts';

type PartiesCall = FileCall & { readonly query: z.infer<typeof partiesExportQuerySchema> };

/** In the order of the form, so that a file that was taken along can be brought in again. */
const COLUMNS: readonly (keyof PartyRow & PartyColumn)[] = [
  'reference', 'buildingAddress', 'interest', 'name', 'kind', 'address', 'email', 'channel',
  'representedBy', 'from', 'to',
]; // prettier-ignore

/** A column of a file with parties: words as they stand in the list. */
export function partyColumn<Row extends Readonly<Partial<Record<PartyColumn, string | null>>>>(
  name: PartyColumn,
): ExportColumn<Row> {
  const cell = (row: Row) => row[name] ?? null;
  return { name, heading: PARTY_COLUMN_WORDS[name], kind: 'text', cell, property: cell };
}

async function* rowsOf(call: PartiesCall) {
  const { services, scheme, query } = call;
  for await (const row of findPartyRows(services.database, scheme.id, query)) {
    yield { reference: row.reference ?? '', row, lonLat: undefined };
  }
}

/** Sends the parties that are seen as a table, a line an interest. */
export async function sendParties(call: PartiesCall): Promise<void> {
  const { search, format } = call.query;
  await sendFile(
    call,
    { what: 'parties', format },
    {
      title: 'Parties',
      columns: COLUMNS.map(partyColumn<PartyRow>),
      rows: rowsOf(call),
      aboutTitle: 'About',
      about: [...(await aboutFile(call)), ['Search', search === '' ? 'none' : search]],
      beside: [],
    },
  );
}
