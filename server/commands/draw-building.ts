import type { z } from 'zod';
import type { drawBuildingSchema, RegisterChange } from '../../shared/schemas/register-changes.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { checkedFootprint } from '../register/check-footprint.ts';
import { checkInArea } from '../register/check-in-area.ts';
import type { Services } from '../services.ts';
import { changeRegister } from './change-register.ts';

/** Brings in a building drawn by hand. */
export async function drawBuilding(
  { database }: Services,
  by: Actor,
  scheme: Scheme,
  { reference, footprint: given, attributes }: z.infer<typeof drawBuildingSchema>,
): Promise<RegisterChange> {
  const footprint = checkedFootprint(given);
  await checkInArea(scheme, footprint);
  const created = [{ reference, footprint, attributes }];
  return database.transaction((transaction) =>
    changeRegister(database, scheme, { kind: 'draw', by }, { created }, transaction),
  );
}
