import { z } from 'zod';
import { LETTER_LIMITS } from './letter-limits.ts';
import { writtenText } from './written.ts';

/**
 * Who is left out although a rule names them, or gets a letter although none does, and why.
 *
 * Units: none. Valid: a reason always. Source: [own].
 */
const exceptionSchema = z.strictObject({
  partyId: z.uuid(),
  why: writtenText(LETTER_LIMITS.why).min(1, 'Say why.'),
});

const exceptions = z.array(exceptionSchema).max(LETTER_LIMITS.chosen);

/**
 * Who is left out of those whom the rules name, and who is chosen by hand.
 *
 * Units: none. Valid: a reason always. Source: [own].
 */
export const letterExceptions = { leftOut: exceptions, chosen: exceptions };
