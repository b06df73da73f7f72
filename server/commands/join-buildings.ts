import type { z } from 'zod';
import { buildingAttributesSchema } from '../../shared/schemas/building-fields.ts';
import type { joinBuildingsSchema, RegisterChange } from '../../shared/schemas/register-changes.ts';
import { AppError } from '../errors.ts';
import { eachField } from '../models/building-columns.ts';
import { findBuildingStates, type KeptBuilding } from '../models/building-state.ts';
import { findFootprints } from '../models/footprints.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { joinFootprints } from '../register/join-footprints.ts';
import type { Services } from '../services.ts';
import { changeRegister } from './change-register.ts';
import { lockScheme } from './lock-scheme.ts';

/** The values of the first, gaps filled from the others in their order. */
function filled(buildings: readonly KeptBuilding[]) {
  const attributes = buildingAttributesSchema.parse(
    eachField((field) => buildings.find((one) => one[field] !== null)?.[field] ?? null),
  );
  const levelled = buildings.find(({ groundLevel }) => groundLevel !== null);
  return { attributes, groundLevelFrom: levelled?.groundLevelFrom ?? null };
}

/** Makes one building of several that touch; the first stays, the others are taken out. */
export async function joinBuildings(
  { database }: Services,
  by: Actor,
  scheme: Scheme,
  { buildings }: z.infer<typeof joinBuildingsSchema>,
): Promise<RegisterChange> {
  const ids = buildings.map(({ id }) => id);
  if (new Set(ids).size < ids.length) {
    const message = 'Choose each building once.';
    throw new AppError('invalid-input', message, [{ path: 'buildings', message }]);
  }
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const states = await findBuildingStates(database, scheme.id, ids, transaction);
    const kept = ids.flatMap((id) => states.get(id) ?? []);
    const footprints = await findFootprints(database, ids, transaction);
    const [first, ...removed] = buildings;
    if (first === undefined || kept.length < ids.length) throw new AppError('not-found');
    const footprint = joinFootprints(
      ids.flatMap((id) => {
        const one = footprints.get(id);
        return one === undefined ? [] : [one];
      }),
    );
    const cause = {
      kind: 'join',
      by,
      source: kept.map(({ reference }) => reference).join(', '),
    } as const;
    const changed = [{ ...first, footprint, ...filled(kept) }];
    return changeRegister(database, scheme, cause, { removed, changed }, transaction);
  });
}
