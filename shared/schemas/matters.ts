import { z } from 'zod';
import { BUILDING_FIELDS, buildingAttributesSchema } from './building-fields.ts';
import { writtenLine, writtenText } from './written.ts';

/**
 * What an owner can bring up: a question, something that worries them, a claim for damage or cost, a fact of
 * the register that is wrong.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const MATTER_KINDS = ['question', 'concern', 'claim', 'correction'] as const;

/**
 * What an owner can bring up.
 *
 * Units: none. Valid: of MATTER_KINDS. Source: [own].
 */
export type MatterKind = (typeof MATTER_KINDS)[number];

/**
 * Where a matter stands: it waits for the team, the team has answered, or nothing more is to come.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const MATTER_STATES = ['open', 'answered', 'closed'] as const;

/**
 * Where a matter stands.
 *
 * Units: none. Valid: of MATTER_STATES. Source: [own].
 */
export type MatterState = (typeof MATTER_STATES)[number];

/**
 * The most that a matter and a message hold.
 *
 * Units: letters for texts, bytes for photographBytes, else pieces. Valid: read only. Source: [own].
 */
export const MATTER_LIMITS = {
  title: 200,
  text: 5000,
  caption: 300,
  photographs: 10,
  photographBytes: 15 * 1024 * 1024,
  openOfOneOwner: 100,
} as const;

/**
 * What of the register an owner may suggest to put right.
 *
 * Units: as BUILDING_FIELDS. Valid: read only. Source: [own].
 */
export const CORRECTED_FIELDS = [
  'address',
  'name',
  'use',
  'storeys',
  'construction',
  'foundation',
  'listedGrade',
] as const;

/**
 * A field of the register that an owner may suggest to put right.
 *
 * Units: none. Valid: of CORRECTED_FIELDS. Source: [own].
 */
export type CorrectedField = (typeof CORRECTED_FIELDS)[number];

const value = z.union([z.string(), z.number()]);

/**
 * What an owner suggests that the register should say.
 *
 * Units: as BUILDING_FIELDS. Valid: a value that the field takes; not empty. Source: [own].
 */
export const suggestionSchema = z
  .strictObject({ field: z.enum(CORRECTED_FIELDS), value })
  .superRefine((suggestion, context) => {
    const found = buildingAttributesSchema.safeParse({ [suggestion.field]: suggestion.value });
    const given = found.data?.[suggestion.field];
    const message =
      found.error?.issues[0]?.message ??
      (given === null ? 'Say what it should be.' : undefined) ??
      (typeof given === 'string' && BUILDING_FIELDS[suggestion.field].kind !== 'text'
        ? 'Write a number.'
        : undefined);
    if (message !== undefined) context.addIssue({ code: 'custom', path: ['value'], message });
  })
  .transform((suggestion) =>
    typeof suggestion.value === 'string'
      ? { ...suggestion, value: suggestion.value.trim() }
      : suggestion,
  );

const title = writtenLine(MATTER_LIMITS.title).min(1, 'Say in a few words what it is about.');

const text = writtenText(MATTER_LIMITS.text).min(1, 'Write something.');

const photographs = z
  .array(
    z.strictObject({
      id: z.uuid(),
      caption: writtenLine(MATTER_LIMITS.caption),
    }),
  )
  .max(MATTER_LIMITS.photographs, `At most ${MATTER_LIMITS.photographs} photographs.`)
  .refine((all) => new Set(all.map(({ id }) => id)).size === all.length, 'One is there twice.');

/**
 * A matter as an owner brings it up, numbered by the browser so that sending it twice brings it up once. Its
 * photographs are announced here and follow one by one. Its number is that of its first message too.
 *
 * Units: as suggestionSchema. Valid: only a correction has a suggestion, and has one. Source: [own].
 */
export const newMatterSchema = z
  .strictObject({
    id: z.uuid(),
    buildingId: z.number().int().min(1).max(2_147_483_647),
    kind: z.enum(MATTER_KINDS),
    title,
    text,
    suggestion: suggestionSchema.nullable(),
    photographs,
  })
  .refine(({ kind, suggestion }) => (suggestion !== null) === (kind === 'correction'), {
    path: ['suggestion'],
    error: 'A correction says which fact is wrong and what it should be.',
  });

/**
 * A matter as an owner brings it up.
 *
 * Units: as newMatterSchema. Valid: parsed by it. Source: [own].
 */
export type NewMatter = z.infer<typeof newMatterSchema>;

/**
 * A further message of an owner.
 *
 * Units: none. Valid: as MATTER_LIMITS. Source: [own].
 */
export const ownMessageSchema = z.strictObject({ id: z.uuid(), text, photographs });

/**
 * A further message of an owner.
 *
 * Units: none. Valid: parsed by ownMessageSchema. Source: [own].
 */
export type OwnMessage = z.infer<typeof ownMessageSchema>;

/**
 * A message of the team: an answer, which goes to the owner, or a note, which does not. It is written on top of
 * the version that was seen, so that nobody answers past what the owner has added.
 *
 * Units: none. Valid: as MATTER_LIMITS; an older version is refused. Source: [own].
 */
export const teamMessageSchema = z.strictObject({
  id: z.uuid(),
  version: z.number().int().min(1),
  side: z.enum(['team', 'note']),
  text,
});

/**
 * A message of the team.
 *
 * Units: none. Valid: parsed by teamMessageSchema. Source: [own].
 */
export type TeamMessage = z.infer<typeof teamMessageSchema>;

/**
 * The address of a matter.
 *
 * Units: none. Valid: a matter of the scheme. Source: [own].
 */
export const matterParamsSchema = z.object({ schemeId: z.string(), matterId: z.uuid() });

/**
 * The address of a photograph of a matter.
 *
 * Units: none. Valid: a photograph that a message of the matter announced. Source: [own].
 */
export const matterPhotographParamsSchema = matterParamsSchema.extend({
  matterPhotographId: z.uuid(),
});

const flag = z.enum(['true', 'false']).transform((given) => given === 'true');

/**
 * Which matters are asked for. What is left out does not matter.
 *
 * Units: none. Valid: text is looked for in titles, messages, names and references. Source: [own].
 */
export const mattersQuerySchema = z.object({
  state: z.enum(MATTER_STATES).optional(),
  kind: z.enum(MATTER_KINDS).optional(),
  mine: flag.optional(),
  overdue: flag.optional(),
  building: z.coerce.number().int().min(1).max(2_147_483_647).optional(),
  text: z.string().trim().max(200).optional(),
});

/**
 * Which matters are asked for.
 *
 * Units: none. Valid: parsed by mattersQuerySchema. Source: [own].
 */
export type MattersQuery = z.infer<typeof mattersQuerySchema>;

/**
 * A change of where a matter stands, on top of the version that was seen. What is left out stays.
 *
 * Units: due is a day. Valid: an older version is refused. Source: [own].
 */
export const changeMatterSchema = z.strictObject({
  version: z.number().int().min(1),
  state: z.enum(MATTER_STATES).optional(),
  due: z.iso.date().optional(),
  assignedTo: z.uuid().nullable().optional(),
});

/**
 * Taking a suggestion over into the register, with an answer to the owner.
 *
 * Units: none. Valid: older versions of the matter or the building are refused. Source: [own].
 */
export const takeSuggestionSchema = z.strictObject({
  version: z.number().int().min(1),
  buildingVersion: z.number().int().min(1),
  message: z.strictObject({ id: z.uuid(), text }),
});
