import type { z } from 'zod';
import type { copyAlignmentSchema } from '../../shared/schemas/alignments.ts';
import type { Alignment } from '../models/alignment.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { insertAlignment } from './insert-alignment.ts';
import { lockAlignment } from './lock-alignment.ts';

/** Adds an option that starts as another one is. */
export async function copyAlignment(
  { database }: Services,
  actor: Actor,
  scheme: Scheme,
  { id, name }: z.infer<typeof copyAlignmentSchema> & { readonly id: string },
): Promise<Alignment> {
  return database.transaction(async (transaction) => {
    const { design, shafts } = await lockAlignment(scheme, id, transaction);
    return insertAlignment(scheme, actor, { name, design, shafts }, 'copy alignment', transaction);
  });
}
