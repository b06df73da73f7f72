import type { z } from 'zod';
import type { drawBuildingSchema, RegisterChange } from '../../shared/schemas/register-changes.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { checkedFootprint } from '../register/check-footprint.ts';
import { checkInArea } from '../register/check-in-area.ts';
import { overlapsOf } from '../register/overlaps-of.ts';
import type { Services } from '../services.ts';
import { changeRegister } from './change-register.ts';

/** Brings in a building drawn by hand, and tells which it lies over: a gallery may lie over a lane. */
export async function drawBuilding(
  { database }: Services,
  by: Actor,
  scheme: Scheme,
  { reference, footprint: given, attributes }: z.infer<typeof drawBuildingSchema>,
): Promise<RegisterChange> {
  const footprint = checkedFootprint(given);
  await checkInArea(scheme, footprint);
  const created = [{ reference, footprint, attributes }];
  const change = await database.transaction((transaction) =>
    changeRegister(database, scheme, { kind: 'draw', by }, { created }, transaction),
  );
  const [id = 0] = change.buildingIds;
  return { ...change, overlaps: await overlapsOf(database, scheme, id) };
}
