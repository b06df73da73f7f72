import type { z } from 'zod';
import type { changeAlignmentSchema } from '../../shared/schemas/alignments.ts';
import { AppError } from '../errors.ts';
import type { Alignment } from '../models/alignment.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockAlignment } from './lock-alignment.ts';
import { recordChange } from './record-change.ts';
import { refuseBadDesign } from './refuse-bad-design.ts';
import { withOwnName } from './with-own-name.ts';

/** Changes an option, unless somebody else has changed it since it was read. */
export async function changeAlignment(
  { database }: Services,
  actor: Actor,
  scheme: Scheme,
  { id, version, ...given }: z.infer<typeof changeAlignmentSchema> & { readonly id: string },
): Promise<Alignment> {
  if (given.design !== undefined) refuseBadDesign(given.design);
  return database.transaction(async (transaction) => {
    const alignment = await lockAlignment(scheme, id, transaction);
    if (alignment.version !== version) throw new AppError('conflict');
    const { name, design, shafts } = alignment;
    const before = { name, design, shafts };
    const after = {
      name: given.name ?? name,
      design: given.design ?? design,
      shafts: given.shafts ?? shafts,
    };
    const stamp = { version: version + 1, changedAt: new Date(), changedBy: actor.id };
    await withOwnName(() => alignment.update({ ...after, ...stamp }, { transaction }), 'an option');
    const subject = { kind: 'alignment', id };
    const change = { by: actor, schemeId: scheme.id, action: 'change alignment', subject };
    await recordChange({ ...change, before, after }, transaction);
    return alignment;
  });
}
