import type { z } from 'zod';
import {
  PARTY_COLUMNS,
  type PartyColumn,
  type PartyColumns,
} from '../../shared/schemas/party-imports.ts';
import {
  partyAddressSchema,
  partyEmailSchema,
  partyNameSchema,
  type InterestValues,
  type PartyValues,
} from '../../shared/schemas/parties.ts';
import { channelOf, interestOf, partyKindOf } from './party-words.ts';
import { readDay } from './read-day.ts';

/** A table as it waits in the database: its columns, and its rows as texts. */
export type StagedTable = {
  readonly columns: readonly string[];
  readonly rows: readonly StagedRow[];
};

export type StagedRow = {
  readonly row: number;
  readonly fault: string | null;
  readonly values: readonly string[];
};

/** What a row says of a party and of its interest in a building that is still to be found. */
export type ReadRow = {
  readonly row: number;
  /** Whether it says more than which building. */
  readonly isFilled: boolean;
  readonly reference: string;
  readonly buildingAddress: string;
  readonly interest: Omit<InterestValues, 'buildingId'>;
  readonly party: Omit<PartyValues, 'interests' | 'representedBy'>;
  readonly representedBy: string;
  readonly problems: readonly string[];
};

/** A spreadsheet is kept from running it by an apostrophe, which is no part of it. */
const KEPT_FROM_RUNNING = /^'(?=\s*[=+\-@|%])/;

const SAID = PARTY_COLUMNS.filter((name) => name !== 'reference' && name !== 'buildingAddress');

type Problems = { readonly list: string[]; readonly text: (column: PartyColumn) => string };

function checked<T>(schema: z.ZodType<T>, value: unknown, what: string, { list }: Problems) {
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  list.push(`${what}: ${parsed.error.issues[0]?.message ?? 'This cannot be read.'}`);
  return undefined;
}

/** One text is parted at its line breaks, else at its commas; several columns are a line each. */
function addressLines(text: Problems['text']): string[] {
  const whole = text('address');
  const lines = /[\r\n]/.test(whole) ? whole.split(/[\r\n]+/) : whole.split(',');
  return [...lines, text('street'), text('place'), text('postcode')];
}

function dayOf(column: 'from' | 'to', what: string, { text, list }: Problems): string | null {
  const said = text(column);
  if (said === '') return null;
  const day = readDay(said);
  if (day === undefined) list.push(`${what}: ${said} is no day. Write it as 2027-06-09.`);
  return day ?? null;
}

const INTEREST_WORDS = 'freeholder, leaseholder, tenant or manager';

function readInterest(problems: Problems): ReadRow['interest'] {
  const { text, list } = problems;
  const said = text('interest');
  const kind = said === '' ? undefined : interestOf(said);
  if (kind === undefined) {
    const wrong = said === '' ? 'It names no interest.' : `${said} is no interest that is known.`;
    list.push(`${wrong} Write ${INTEREST_WORDS}.`);
  }
  const [from, to] = [dayOf('from', 'From', problems), dayOf('to', 'To', problems)];
  if (from !== null && to !== null && from > to) list.push('The interest ends before it begins.');
  return { kind: kind ?? 'freeholder', from, to };
}

function readParty(problems: Problems): ReadRow['party'] {
  const { text, list } = problems;
  const said = text('email');
  const read = said === '' ? undefined : checked(partyEmailSchema, said, 'E-mail', problems);
  const email = read ?? null;
  const kind = text('kind') === '' ? 'person' : partyKindOf(text('kind'));
  if (kind === undefined) list.push(`${text('kind')} is no kind. Write person or organisation.`);
  const usual = email === null ? 'post' : 'e-mail';
  const channel = text('channel') === '' ? usual : channelOf(text('channel'));
  if (channel === undefined)
    list.push(`${text('channel')} is no way to write. Write e-mail or post.`);
  if (channel === 'e-mail' && said === '') {
    list.push('Letters by e-mail need an e-mail address. Give one, or write post.');
  }
  return {
    kind: kind ?? 'person',
    name: checked(partyNameSchema, text('name'), 'Name', problems) ?? '',
    address: checked(partyAddressSchema, addressLines(text), 'Postal address', problems) ?? [],
    email,
    channel: channel ?? usual,
  };
}

/** Reads rows by the columns that were chosen; what cannot be read is a problem, as a sentence. */
export function rowReader(table: StagedTable, columns: PartyColumns): (row: StagedRow) => ReadRow {
  const places = new Map(table.columns.map((name, index) => [name, index]));
  return ({ row, fault, values }) => {
    const text = (column: PartyColumn) => {
      const place = places.get(columns[column] ?? '');
      const value = place === undefined ? '' : (values[place] ?? '');
      return value.replace(KEPT_FROM_RUNNING, '').trim();
    };
    const problems: Problems = { list: fault === null ? [] : [fault], text };
    return {
      row,
      isFilled: SAID.some((column) => text(column) !== ''),
      reference: text('reference'),
      buildingAddress: text('buildingAddress'),
      interest: readInterest(problems),
      party: readParty(problems),
      representedBy: text('representedBy'),
      problems: problems.list,
    };
  };
}
