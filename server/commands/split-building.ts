import type { Transaction } from 'sequelize';
import type { z } from 'zod';
import { BUILDING_TEXT, buildingAttributesSchema } from '../../shared/schemas/building-fields.ts';
import type { RegisterChange, splitBuildingSchema } from '../../shared/schemas/register-changes.ts';
import { AppError } from '../errors.ts';
import { eachField } from '../models/building-columns.ts';
import { findBuildingStates } from '../models/building-state.ts';
import { findReferences } from '../models/find-references.ts';
import { findFootprints } from '../models/footprints.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { splitFootprint } from '../register/split-footprint.ts';
import type { Services } from '../services.ts';
import { changeRegister } from './change-register.ts';
import { lockScheme } from './lock-scheme.ts';

/** References that are free, after that of the building: B12-2, B12-3. */
async function freeReferences(
  scheme: Scheme,
  reference: string,
  count: number,
  transaction: Transaction,
): Promise<string[]> {
  // room for a dash and figures
  const stem = `${reference.slice(0, BUILDING_TEXT.reference - 8)}-`;
  const taken = await findReferences(scheme.sequelize, scheme.id, stem, transaction);
  const free: string[] = [];
  for (let number = 2; free.length < count; number += 1) {
    if (!taken.has(`${stem}${number}`)) free.push(`${stem}${number}`);
  }
  return free;
}

/** Cuts a building along a line: the largest piece stays, the others are new with the same values. */
export async function splitBuilding(
  { database }: Services,
  by: Actor,
  scheme: Scheme,
  { id, version, line }: z.infer<typeof splitBuildingSchema> & { readonly id: number },
): Promise<RegisterChange> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const kept = (await findBuildingStates(database, scheme.id, [id], transaction)).get(id);
    const whole = (await findFootprints(database, [id], transaction)).get(id);
    if (kept === undefined || whole === undefined) throw new AppError('not-found');
    const [footprint, ...pieces] = splitFootprint(whole, line);
    const free = await freeReferences(scheme, kept.reference, pieces.length, transaction);
    const attributes = buildingAttributesSchema.parse(eachField((field) => kept[field]));
    const { groundLevelFrom } = kept;
    const created = pieces.map((piece, k) => {
      return { reference: free[k] ?? '', footprint: piece, attributes, groundLevelFrom };
    });
    const cause = { kind: 'split', by, source: kept.reference } as const;
    const changed = [{ id, version, footprint }];
    return changeRegister(database, scheme, cause, { changed, created }, transaction);
  });
}
