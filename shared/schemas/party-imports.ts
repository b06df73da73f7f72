import { z } from 'zod';

/**
 * What a column of a table of parties can hold, in the order of the form.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const PARTY_COLUMNS = [
  'reference',
  'buildingAddress',
  'interest',
  'name',
  'kind',
  'address',
  'street',
  'place',
  'postcode',
  'email',
  'channel',
  'representedBy',
  'from',
  'to',
] as const;

/**
 * What a column of a table of parties can hold.
 *
 * Units: none. Valid: one of PARTY_COLUMNS. Source: [own].
 */
export type PartyColumn = (typeof PARTY_COLUMNS)[number];

/**
 * What stands over these columns in files and on the screen.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const PARTY_COLUMN_WORDS: Readonly<Record<PartyColumn, string>> = {
  reference: 'Building reference',
  buildingAddress: 'Building address',
  interest: 'Interest',
  name: 'Name',
  kind: 'Kind of party',
  address: 'Postal address',
  street: 'Street',
  place: 'Place',
  postcode: 'Postcode',
  email: 'E-mail',
  channel: 'Letters by',
  representedBy: 'Represented by',
  from: 'From',
  to: 'To',
};

/**
 * How large a file of parties may be.
 *
 * Units: bytes, pieces. Valid: read only. Source: [own].
 */
export const PARTY_IMPORT_LIMITS = { bytes: 20 * 1024 * 1024, rows: 50_000, page: 100 } as const;

/**
 * What a row of the file comes to.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const PARTY_ROW_OUTCOMES = [
  'new party',
  'new interest',
  'there already',
  'problem',
] as const;

const chosenColumns = z.partialRecord(z.enum(PARTY_COLUMNS), z.string().max(300));

/**
 * Which column of the file holds what.
 *
 * Units: none. Valid: a column once at most. Source: [own].
 */
export const partyColumnsSchema = z
  .strictObject({ columns: chosenColumns })
  .refine(({ columns }) => new Set(Object.values(columns)).size === Object.keys(columns).length, {
    path: ['columns'],
    error: 'Two of these are read from one column. Choose a column once.',
  });

/**
 * Which column of the file holds what.
 *
 * Units: none. Valid: parsed by partyColumnsSchema. Source: [own].
 */
export type PartyColumns = z.infer<typeof chosenColumns>;

const count = z.number().int().min(0);

/**
 * What an import comes to: rows by outcome, rows with a remark, parties that are added, and parties there
 * already to which something is added.
 *
 * Units: pieces. Valid: the four outcomes add up to the rows. Source: [own].
 */
export const partyImportCountsSchema = z.strictObject({
  rows: count,
  'new party': count,
  'new interest': count,
  'there already': count,
  problem: count,
  noted: count,
  partiesAdded: count,
  partiesCompleted: count,
});

/**
 * What an import comes to.
 *
 * Units: pieces. Valid: parsed by partyImportCountsSchema. Source: [own].
 */
export type PartyImportCounts = z.infer<typeof partyImportCountsSchema>;

/**
 * Taking over what was checked: the counts that were seen.
 *
 * Units: pieces. Valid: other counts than those of now are refused. Source: [own].
 */
export const takeOverSchema = z.strictObject({ counts: partyImportCountsSchema });

/**
 * The address of an import of parties.
 *
 * Units: none. Valid: an import of the scheme. Source: [own].
 */
export const partyImportParamsSchema = z.object({
  schemeId: z.string(),
  partyImportId: z.uuid(),
});

/**
 * Which rows of the report are asked for: all, those of one outcome, or those with a remark.
 *
 * Units: pieces. Valid: at most 100 at once. Source: [own].
 */
export const partyImportRowsQuerySchema = z.object({
  only: z.enum([...PARTY_ROW_OUTCOMES, 'noted']).optional(),
  offset: z.coerce.number().int().min(0).max(PARTY_IMPORT_LIMITS.rows).default(0),
});

/**
 * A row of the report: where it stands in the file, what it comes to, and what to know about it.
 *
 * Units: none. Valid: once the import has ended, without the name. Source: [own].
 */
export const partyImportRowSchema = z.strictObject({
  row: z.number(),
  reference: z.string(),
  name: z.string(),
  outcome: z.enum(PARTY_ROW_OUTCOMES),
  remarks: z.array(z.string()),
});

/**
 * A row of the report.
 *
 * Units: none. Valid: parsed by partyImportRowSchema. Source: [own].
 */
export type PartyImportRow = z.infer<typeof partyImportRowSchema>;

/**
 * A page of the report.
 *
 * Units: pieces. Valid: at most 100 rows. Source: [own].
 */
export const partyImportRowsSchema = z.strictObject({
  found: z.number(),
  rows: z.array(partyImportRowSchema),
});

/**
 * An import of parties. Nothing is written to the list of parties before it is taken over.
 *
 * Units: pieces. Valid: the columns of the file are named while it is checked only, and not in lists.
 * Source: [own].
 */
export const partyImportSchema = z.strictObject({
  id: z.uuid(),
  fileName: z.string(),
  state: z.enum(['checked', 'taken over', 'given up']),
  fileColumns: z.array(z.string()),
  columns: chosenColumns,
  counts: partyImportCountsSchema,
  by: z.string(),
  sentAt: z.iso.datetime(),
  endedAt: z.iso.datetime().nullable(),
});

/**
 * An import of parties.
 *
 * Units: pieces. Valid: parsed by partyImportSchema. Source: [own].
 */
export type PartyImport = z.infer<typeof partyImportSchema>;

/**
 * Imports of parties, the newest first.
 *
 * Units: pieces. Valid: at most 50. Source: [own].
 */
export const partyImportsSchema = z.array(partyImportSchema);
