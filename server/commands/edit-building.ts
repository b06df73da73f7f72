import type { z } from 'zod';
import type { editBuildingSchema, RegisterChange } from '../../shared/schemas/register-changes.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { checkedFootprint } from '../register/check-footprint.ts';
import { checkInArea } from '../register/check-in-area.ts';
import { overlapsOf } from '../register/overlaps-of.ts';
import type { Services } from '../services.ts';
import { changeRegister } from './change-register.ts';

/**
 * Changes a building of the register, unless somebody else has changed it since it was seen, and tells
 * which others a new footprint lies over.
 */
export async function editBuilding(
  { database }: Services,
  by: Actor,
  scheme: Scheme,
  { id, footprint: given, ...edit }: z.infer<typeof editBuildingSchema> & { readonly id: number },
): Promise<RegisterChange> {
  const footprint = given && checkedFootprint(given);
  if (footprint !== undefined) await checkInArea(scheme, footprint);
  const changed = [{ id, ...edit, footprint }];
  const change = await database.transaction((transaction) =>
    changeRegister(database, scheme, { kind: 'edit', by }, { changed }, transaction),
  );
  if (footprint === undefined) return change;
  return { ...change, overlaps: await overlapsOf(database, scheme, id) };
}
