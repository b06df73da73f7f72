import { csvCell } from '../../server/documents/csv-cell.ts';
import { metresFromDemoLine } from '../../server/seed/metres-from-demo-line.ts';
import { PARTY_COLUMN_WORDS, type PartyColumn } from '../../shared/schemas/party-imports.ts';
import type { Feature } from './features.ts';
import { createRandom, type Random } from './prng.ts';

const BUILDINGS = 250;

type Row = Partial<Record<PartyColumn, string>>;
type House = { readonly reference: string; readonly address: string; readonly random: Random };

const COLUMNS: readonly PartyColumn[] = [
  'reference', 'buildingAddress', 'interest', 'name', 'kind', 'street', 'place', 'email', 'channel',
  'representedBy', 'from', 'to',
]; // prettier-ignore

function body(name: string, street: string, email: string): Row {
  const channel = email === '' ? 'post' : 'e-mail';
  return { kind: 'organisation', name, street, place: 'Port Dogger', email, channel };
}

const AGENTS = body('Quayside Managing Agents', '3 Custom House Quay', 'quayside@example.org');

/** Bodies that hold many buildings. */
const BODIES: readonly Row[] = [
  body('Harbour Terraces Trust', '1 Custom House Quay', 'terraces@example.org'),
  body('Old Town Housing Society', '5 Custom House Quay', 'old-town@example.org'),
  body('Dogger Quay Estates', '7 Custom House Quay', 'estates@example.org'),
  body('Almshouse Charity of Port Dogger', '9 Custom House Quay', ''),
];

/** People go by what they are, not by names. */
function person(role: string, interest: string, { reference, address, random }: House): Row {
  const isOnPaper = random.chance(0.35);
  const email = isOnPaper ? '' : `${interest}-${reference.toLowerCase()}@example.org`;
  return {
    ...{ reference, interest, name: `${role} of ${address}`, kind: 'person', street: address },
    ...{ place: 'Port Dogger', email, channel: isOnPaper ? 'post' : 'e-mail' },
    from: `${random.whole(1985, 2025)}-${String(random.whole(1, 12)).padStart(2, '0')}-01`,
  };
}

function partiesOf(house: House): Row[] {
  const { reference, random } = house;
  if (random.chance(0.55)) return [person('Freeholder', 'freeholder', house)];
  const holder = random.pick(BODIES);
  const rows: Row[] = [{ ...holder, reference, interest: 'freeholder' }];
  if (random.chance(0.4)) rows.push(person('Leaseholder', 'leaseholder', house));
  else if (random.chance(0.7)) rows.push(person('Tenant', 'tenant', house));
  if (random.chance(0.3)) rows.push({ ...AGENTS, reference, interest: 'manager' });
  return rows;
}

/** What goes wrong in real tables, once each: unknown reference, no address for e-mail, half an address. */
function faultyRows(house: House): Row[] {
  const tenant = { ...person('Tenant', 'tenant', house), channel: 'post' };
  return [
    { ...tenant, reference: 'B99999' },
    { ...tenant, name: `Upper tenant of ${house.address}`, email: '', channel: 'e-mail' },
    { ...tenant, reference: '', buildingAddress: house.address.replace(/^\d+ /, '') },
  ];
}

function line(row: Row): string {
  return `${COLUMNS.map((name) => csvCell(row[name] ?? '')).join(',')}\n`;
}

/** The demo's owner has it already: the listed dwelling that stands closest to the line. */
function withoutOwnersHouse<Near extends { readonly isListedDwelling: boolean }>(
  near: readonly Near[],
): Near[] {
  const taken = near.find(({ isListedDwelling }) => isListedDwelling);
  return near.filter((house) => house !== taken);
}

/** Invented parties for the buildings nearest to the demo's first line, to be brought in by hand. */
export function partiesText(buildings: readonly Feature[], seed: number): string {
  const random = createRandom(seed).fork('parties');
  const sorted = buildings
    .map(({ geometry, properties: { reference, address, use, listed } }) => {
      const ring = geometry.type === 'Polygon' ? (geometry.coordinates[0] ?? []) : [];
      const house = { reference: String(reference), address: String(address) };
      const isListedDwelling = use === 'dwelling' && listed !== 'not listed';
      const off = metresFromDemoLine(ring);
      return { ...house, random: random.fork(house.reference), off, isListedDwelling };
    })
    .sort((a, b) => a.off - b.off);
  const near = withoutOwnersHouse(sorted).slice(0, BUILDINGS);
  const [first] = near;
  const rows = [...near.flatMap(partiesOf), ...(first === undefined ? [] : faultyRows(first))];
  const heading = COLUMNS.map((name) => PARTY_COLUMN_WORDS[name]).join(',');
  return [`${heading}\n`, ...rows.map(line)].join('');
}
