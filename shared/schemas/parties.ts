import { z } from 'zod';

/**
 * What a party is.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const PARTY_KINDS = ['person', 'organisation'] as const;

/**
 * How a party is written to.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const PARTY_CHANNELS = ['e-mail', 'post'] as const;

/**
 * What a party has to do with a building.
 *
 * Units: none. Valid: closed list. Source: [common].
 */
export const INTEREST_KINDS = ['freeholder', 'leaseholder', 'tenant', 'manager'] as const;

/**
 * How long what is written of a party may be, and how much one may hold.
 *
 * Units: letters, lines, pieces. Valid: read only. Source: [own].
 */
export const PARTY_LIMITS = {
  name: 300,
  line: 120,
  lines: 8,
  email: 254,
  interests: 2000,
  ground: 500,
  search: 200,
  page: 200,
} as const;

/** Marks that end a line or make letters run the other way than they are written. */
const UNSEEN = /[\p{Cc}\p{Zl}\p{Zp}\p{Surrogate}\u202A-\u202E\u2066-\u2069]/u;

function written(longest: number) {
  return z
    .string()
    .trim()
    .refine((text) => Array.from(text).length <= longest, {
      error: `At most ${longest} letters.`,
    })
    .refine((text) => !UNSEEN.test(text), {
      error:
        'It holds marks that cannot be seen and turn letters round or break the line. Write it again without them.',
    });
}

/**
 * What a party is called.
 *
 * Units: none. Valid: any letters of any writing, one line, up to 300. Source: [own].
 */
export const partyNameSchema = written(PARTY_LIMITS.name).min(1, 'Write the name.');

/**
 * A postal address, line by line as it stands on an envelope.
 *
 * Units: none. Valid: one to eight lines; lines that are blank are left out. Source: [own].
 */
export const partyAddressSchema = z
  .array(written(PARTY_LIMITS.line))
  .max(40, `At most ${PARTY_LIMITS.lines} lines.`)
  .transform((lines) => lines.filter((line) => line !== ''))
  .pipe(
    z
      .array(z.string())
      .min(1, 'Write the address as it stands on an envelope.')
      .max(PARTY_LIMITS.lines, `At most ${PARTY_LIMITS.lines} lines.`),
  );

/**
 * Where a party gets e-mail.
 *
 * Units: none. Valid: an address that mail can go to. Source: [common].
 */
export const partyEmailSchema = z
  .string()
  .trim()
  .max(PARTY_LIMITS.email, 'This is too long for an e-mail address.')
  .pipe(z.email('This is not an e-mail address.'));

const buildingId = z.number().int().min(1).max(2_147_483_647);

/**
 * What of one building a party holds; a day that is not known is null.
 *
 * Units: days. Valid: the first day is not after the last. Source: [own].
 */
export const interestValuesSchema = z
  .strictObject({
    buildingId,
    kind: z.enum(INTEREST_KINDS),
    from: z.iso.date('Write a day.').nullable(),
    to: z.iso.date('Write a day.').nullable(),
  })
  .refine(({ from, to }) => from === null || to === null || from <= to, {
    path: ['to'],
    error: 'It ends before it begins.',
  });

/**
 * What of one building a party holds.
 *
 * Units: days. Valid: parsed by interestValuesSchema. Source: [own].
 */
export type InterestValues = z.infer<typeof interestValuesSchema>;

/**
 * What is written of a party.
 *
 * Units: none. Valid: letters by e-mail need an e-mail address; buildings are of the scheme; whoever
 * represents them is another party of it. Source: [own].
 */
export const partyValuesSchema = z
  .strictObject({
    kind: z.enum(PARTY_KINDS),
    name: partyNameSchema,
    address: partyAddressSchema,
    email: partyEmailSchema.nullable(),
    channel: z.enum(PARTY_CHANNELS),
    representedBy: z.uuid().nullable(),
    interests: z.array(interestValuesSchema).max(PARTY_LIMITS.interests),
  })
  .refine(({ channel, email }) => channel === 'post' || email !== null, {
    path: ['email'],
    error: 'Letters by e-mail need an e-mail address.',
  });

/**
 * What is written of a party.
 *
 * Units: none. Valid: parsed by partyValuesSchema. Source: [own].
 */
export type PartyValues = z.infer<typeof partyValuesSchema>;

const version = z.number().int().min(1);

/**
 * A change of a party, on top of the version that was seen.
 *
 * Units: none. Valid: an older version is refused. Source: [own].
 */
export const changePartySchema = z.strictObject({ version, values: partyValuesSchema });

/**
 * Two parties become one: the one of the address stays, the other is named here.
 *
 * Units: none. Valid: both as they were seen; an older version is refused. Source: [own].
 */
export const mergePartiesSchema = z.strictObject({
  version,
  other: z.strictObject({ id: z.uuid(), version }),
});

/**
 * Erasing what is known of a party: on which ground, and the day on which it was asked for.
 *
 * Units: none. Valid: an older version is refused. Source: [own].
 */
export const erasePartySchema = z.strictObject({
  version,
  ground: written(PARTY_LIMITS.ground).min(1, 'Say on which ground.'),
  askedOn: z.iso.date('Write the day on which it was asked for.'),
});

/**
 * The address of a party.
 *
 * Units: none. Valid: a party of the scheme. Source: [own].
 */
export const partyParamsSchema = z.object({ schemeId: z.string(), partyId: z.uuid() });

const whichParties = {
  search: z
    .string()
    .trim()
    .max(PARTY_LIMITS.search)
    .regex(/^\P{Cc}*$/u)
    .default(''),
  building: z.coerce.number().int().min(1).max(2_147_483_647).optional(),
};

/**
 * Which parties are asked for: words of name, address, e-mail or building, and one building's only.
 *
 * Units: none. Valid: every word has to be found; upper and lower case are alike. Source: [own].
 */
export const partiesQuerySchema = z.object({
  ...whichParties,
  offset: z.coerce.number().int().min(0).max(1_000_000).default(0),
  limit: z.coerce.number().int().min(1).max(PARTY_LIMITS.page).default(PARTY_LIMITS.page),
});

/**
 * The formats of files with parties.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const PARTY_FILE_FORMATS = ['xlsx', 'csv'] as const;

/**
 * A file with what is seen of the list of parties.
 *
 * Units: none. Valid: as partiesQuerySchema. Source: [own].
 */
export const partiesExportQuerySchema = z.object({
  ...whichParties,
  format: z.enum(PARTY_FILE_FORMATS),
});

/**
 * A table of all buildings to be filled in with parties.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const partyFormQuerySchema = z.object({ format: z.enum(PARTY_FILE_FORMATS) });

const building = z.strictObject({
  id: z.number(),
  reference: z.string(),
  address: z.string().nullable(),
});

const interestSchema = z.strictObject({
  id: z.uuid(),
  building,
  kind: z.enum(INTEREST_KINDS),
  from: z.string().nullable(),
  to: z.string().nullable(),
});

/**
 * A party. One that was merged says into which, one that was erased when.
 *
 * Units: none. Valid: version grows with every change; of an erased one all that is personal is empty.
 * Source: [own].
 */
export const partySchema = z.strictObject({
  id: z.uuid(),
  kind: z.enum(PARTY_KINDS),
  name: z.string(),
  address: z.array(z.string()),
  email: z.string().nullable(),
  channel: z.enum(PARTY_CHANNELS),
  representedBy: z.strictObject({ id: z.uuid(), name: z.string() }).nullable(),
  person: z.strictObject({ name: z.string(), email: z.string() }).nullable(),
  version: z.number(),
  interests: z.array(interestSchema),
  mergedInto: z.uuid().nullable(),
  erasedAt: z.iso.datetime().nullable(),
});

/**
 * A party.
 *
 * Units: none. Valid: parsed by partySchema. Source: [own].
 */
export type Party = z.infer<typeof partySchema>;
