import { z } from 'zod';
import { partySchema } from './parties.ts';

/**
 * A page of parties by name, with how many are found in all. Each has its first three interests, those in
 * the building that was asked for before others, and the number of all.
 *
 * Units: none. Valid: at most 200 parties. Source: [own].
 */
export const partiesSchema = z.strictObject({
  found: z.number(),
  parties: z.array(partySchema.extend({ interestCount: z.number() })),
});

/**
 * A party in a list.
 *
 * Units: none. Valid: parsed by partiesSchema. Source: [own].
 */
export type ListedParty = z.infer<typeof partiesSchema>['parties'][number];

const told = z.record(z.string(), z.unknown()).nullable();

/**
 * A party with what it was before, the newest change first, and the last day on which its letters are kept
 * once it is erased.
 *
 * Units: none. Valid: once erased, the changes say neither before nor after. Source: [own].
 */
export const partyDetailSchema = z.strictObject({
  party: partySchema,
  lettersKeptUntil: z.iso.date().nullable(),
  history: z.array(
    z.strictObject({
      at: z.iso.datetime(),
      by: z.string().nullable(),
      action: z.string(),
      before: told,
      after: told,
    }),
  ),
});

/**
 * A party with what it was before.
 *
 * Units: none. Valid: parsed by partyDetailSchema. Source: [own].
 */
export type PartyDetail = z.infer<typeof partyDetailSchema>;

/**
 * Parties that are likely the same, group by group, and what they have in common.
 *
 * Units: none. Valid: at least two parties a group, at most 100 groups. Source: [own].
 */
export const likelySameSchema = z.array(
  z.strictObject({
    because: z.enum(['same e-mail', 'same name and address']),
    parties: z.array(
      partySchema.pick({
        ...{ id: true, kind: true, name: true, address: true, email: true, version: true },
      }),
    ),
  }),
);

/**
 * Parties that are likely the same.
 *
 * Units: none. Valid: parsed by likelySameSchema. Source: [own].
 */
export type LikelySame = z.infer<typeof likelySameSchema>;
