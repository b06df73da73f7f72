import type { z } from 'zod';
import type { editBuildingSchema, RegisterChange } from '../../shared/schemas/register-changes.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { checkedFootprint } from '../register/check-footprint.ts';
import { checkInArea } from '../register/check-in-area.ts';
import type { Services } from '../services.ts';
import { changeRegister } from './change-register.ts';

/** Changes a building of the register, unless somebody else has changed it since it was seen. */
export async function editBuilding(
  { database }: Services,
  by: Actor,
  scheme: Scheme,
  { id, footprint: given, ...edit }: z.infer<typeof editBuildingSchema> & { readonly id: number },
): Promise<RegisterChange> {
  const footprint = given && checkedFootprint(given);
  if (footprint !== undefined) await checkInArea(scheme, footprint);
  const changed = [{ id, ...edit, footprint }];
  return database.transaction((transaction) =>
    changeRegister(database, scheme, { kind: 'edit', by }, { changed }, transaction),
  );
}
