import { z } from 'zod';
import { CORRECTED_FIELDS, MATTER_KINDS, MATTER_STATES } from './matters.ts';

const value = z.union([z.string(), z.number()]);

const photographAnswer = z.strictObject({
  id: z.uuid(),
  caption: z.string(),
  hasArrived: z.boolean(),
});

const building = z.strictObject({
  id: z.number(),
  reference: z.string(),
  name: z.string().nullable(),
  address: z.string().nullable(),
});

const suggestionAnswer = z.strictObject({
  field: z.enum(CORRECTED_FIELDS),
  value,
  /** What the register said when it was suggested. */
  was: value.nullable(),
  /** Whether the register has taken it over. */
  isTakenOver: z.boolean(),
});

/**
 * What was suggested, as it is kept.
 *
 * Units: as BUILDING_FIELDS. Valid: parsed by matterSchema. Source: [own].
 */
export type KeptSuggestion = z.infer<typeof suggestionAnswer>;

const matterShape = {
  id: z.uuid(),
  kind: z.enum(MATTER_KINDS),
  building,
  title: z.string(),
  suggestion: suggestionAnswer.nullable(),
  state: z.enum(MATTER_STATES),
  due: z.iso.date(),
  openedAt: z.iso.datetime(),
  changedAt: z.iso.datetime(),
};

/**
 * A matter as its owner reads it, with what was written on both sides, the oldest first. Who of the team wrote
 * is not told, and notes are not there; nor is its number, which would tell how many there are.
 *
 * Units: none. Valid: `due` is when an answer was promised. Source: [own].
 */
export const ownMatterSchema = z.strictObject({
  ...matterShape,
  messages: z.array(
    z.strictObject({
      id: z.uuid(),
      side: z.enum(['owner', 'team']),
      text: z.string(),
      writtenAt: z.iso.datetime(),
      photographs: z.array(photographAnswer),
    }),
  ),
});

/**
 * A matter as its owner reads it.
 *
 * Units: as ownMatterSchema. Valid: parsed by it. Source: [own].
 */
export type OwnMatter = z.infer<typeof ownMatterSchema>;

/**
 * An owner's matters, the newest first.
 *
 * Units: as ownMatterSchema. Valid: at most 500. Source: [own].
 */
export const ownMattersSchema = z.array(ownMatterSchema);

const person = z.strictObject({ id: z.uuid(), name: z.string() });

const teamShape = {
  ...matterShape,
  number: z.number(),
  party: person,
  assignedTo: person.nullable(),
  isOverdue: z.boolean(),
  isErased: z.boolean(),
  version: z.number(),
};

/**
 * A matter as a line of the team's inbox.
 *
 * Units: messages in pieces. Valid: overdue is open after the day that was promised; title and
 * suggestion of an erased party are empty but for the administrator. Source: [own].
 */
export const matterLineSchema = z.strictObject({ ...teamShape, messages: z.number() });

/**
 * A matter as a line of the team's inbox.
 *
 * Units: as matterLineSchema. Valid: parsed by it. Source: [own].
 */
export type MatterLine = z.infer<typeof matterLineSchema>;

/**
 * The team's inbox: what is due first at the top, and how many there are.
 *
 * Units: total in pieces. Valid: at most 500 lines. Source: [own].
 */
export const mattersSchema = z.strictObject({
  total: z.number(),
  matters: z.array(matterLineSchema),
  /** To whom one can be given. */
  assessors: z.array(person),
});

/**
 * A matter with everything that was written, the oldest first.
 *
 * Units: none. Valid: building.version is what a taken over suggestion goes on top of; isMailed tells whether
 * an answer reaches the owner by e-mail. Of an erased party what was written is there for the administrator
 * alone. Source: [own].
 */
export const matterSchema = z.strictObject({
  ...teamShape,
  building: building.extend({ version: z.number(), isInRegister: z.boolean() }),
  isMailed: z.boolean(),
  assessors: z.array(person),
  messages: z.array(
    z.strictObject({
      id: z.uuid(),
      side: z.enum(['owner', 'team', 'note']),
      by: z.string(),
      text: z.string(),
      writtenAt: z.iso.datetime(),
      photographs: z.array(photographAnswer),
    }),
  ),
});

/**
 * A matter with everything that was written.
 *
 * Units: as matterSchema. Valid: parsed by it. Source: [own].
 */
export type Matter = z.infer<typeof matterSchema>;
