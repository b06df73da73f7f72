import { PARTY_COLUMNS } from '../../shared/schemas/party-imports.ts';
import type { PARTY_FILE_FORMATS } from '../../shared/schemas/parties.ts';
import { findFormRows } from '../models/party-rows.ts';
import { aboutFile, sendFile, type FileCall } from './send-file.ts';
import { partyColumn } from './send-parties.ts';

/** What stands in the form already, and what is to be filled in: one address column is enough. */
const COLUMNS = PARTY_COLUMNS.filter((name) => !['street', 'place', 'postcode'].includes(name));

const HOW = [
  [
    'One line',
    'One interest of one party in one building. Copy the line of a building for another.',
  ],
  ['Interest', 'freeholder, leaseholder, tenant or manager'],
  ['Kind of party', 'person or organisation; person where it is left empty'],
  ['Postal address', 'Lines as on an envelope, one below the other or parted by commas'],
  ['Letters by', 'e-mail or post; e-mail where there is an address and this is left empty'],
  ['Represented by', 'The name of another party in this table or in the list'],
  ['From, To', 'Days as 2027-06-09; empty where not known'],
] as const;

/** Sends a table of all buildings of the register in which parties can be filled in. */
export async function sendPartyForm(
  call: FileCall & { readonly format: (typeof PARTY_FILE_FORMATS)[number] },
): Promise<void> {
  const { services, scheme, format } = call;
  const buildings = await findFormRows(services.database, scheme.id);
  async function* rows() {
    for (const row of buildings) yield await Promise.resolve({ ...row, row, lonLat: undefined });
  }
  await sendFile(
    call,
    { what: 'parties-form', format },
    {
      title: 'Parties',
      columns: COLUMNS.map((name) => partyColumn(name)),
      rows: rows(),
      aboutTitle: 'How to fill it in',
      about: [...(await aboutFile(call)), ...HOW],
      beside: [],
    },
  );
}
