import type { z } from 'zod';
import type { newAlignmentSchema } from '../../shared/schemas/alignments.ts';
import type { Alignment } from '../models/alignment.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { insertAlignment } from './insert-alignment.ts';
import { lockScheme } from './lock-scheme.ts';
import { refuseBadDesign } from './refuse-bad-design.ts';

/** Adds an option for the line of a scheme. */
export async function createAlignment(
  { database }: Services,
  actor: Actor,
  scheme: Scheme,
  given: z.infer<typeof newAlignmentSchema>,
): Promise<Alignment> {
  refuseBadDesign(given.design);
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    return insertAlignment(scheme, actor, given, 'create alignment', transaction);
  });
}
