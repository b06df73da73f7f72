import { z } from 'zod';
import { roleSchema } from './roles.ts';

/**
 * What can wait for a person.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const WAITING_KINDS = [
  'roles-not-filled',
  'invitations-not-accepted',
  'no-buildings',
  'no-background',
  'decisions-to-check',
  'decisions-returned',
  'decisions-again',
  'letters-to-check',
  'letters-to-send',
  'letters-returned',
  'matters-waiting',
  'appointments-asked',
  'undertakings-overdue',
] as const;

/**
 * One thing that waits for a person: how many of it, in words, since when, and where to go.
 *
 * Units: count in pieces; since is a point of time. Valid: link is a page of this application.
 * Source: [own].
 */
export const waitingItemSchema = z.strictObject({
  kind: z.enum(WAITING_KINDS),
  count: z.number().int().positive(),
  text: z.string(),
  since: z.iso.datetime(),
  link: z.string(),
});

/**
 * What waits for the caller: outside any scheme, and by scheme. Every scheme that the caller has a part
 * in is there, also where nothing waits; an archived one has nothing waiting.
 *
 * Units: as waitingItemSchema. Valid: the schemes by name. Source: [own].
 */
export const waitingSchema = z.strictObject({
  general: z.array(waitingItemSchema),
  schemes: z.array(
    z.strictObject({
      scheme: z.strictObject({
        id: z.uuid(),
        name: z.string(),
        archivedAt: z.iso.datetime().nullable(),
      }),
      roles: z.array(roleSchema),
      waiting: z.array(waitingItemSchema),
    }),
  ),
});

/**
 * One thing that waits for a person.
 *
 * Units: as waitingItemSchema. Valid: parsed by it. Source: [own].
 */
export type WaitingItem = z.infer<typeof waitingItemSchema>;

/**
 * What waits for the caller.
 *
 * Units: as waitingSchema. Valid: parsed by it. Source: [own].
 */
export type WaitingAnswer = z.infer<typeof waitingSchema>;
