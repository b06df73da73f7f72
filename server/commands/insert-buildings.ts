import { UniqueConstraintError, type Transaction } from 'sequelize';
import { findCrs } from '../crs/find-crs.ts';
import { toLonLat } from '../crs/to-lon-lat.ts';
import { AppError } from '../errors.ts';
import { placedFootprint } from '../importers/placed-footprint.ts';
import type { FootprintRings } from '../models/building.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { insertBuildingRows, type BuildingAttributes } from '../models/insert-building-rows.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/**
 * A building as it is brought in. Its footprint, in the scheme's grid, is the truth; where it lies in
 * longitude and latitude is derived. What is left out is unknown.
 */
export type NewBuilding = Partial<BuildingAttributes> & {
  readonly reference: string;
  readonly footprint: FootprintRings;
};

const AT_ONCE = 5000;

async function placeOnMap(scheme: Scheme): Promise<ReturnType<typeof toLonLat>> {
  const system = await findCrs(scheme.crs);
  if (system === undefined || 'fault' in system) throw new AppError('internal');
  return toLonLat(system.crs.definition);
}

/** Brings buildings into a scheme's register in a transaction of the caller's: all of them or none. */
export async function insertBuildings(
  scheme: Scheme,
  buildings: readonly NewBuilding[],
  transaction: Transaction,
  by: Pick<Actor, 'id'> | null = null,
): Promise<void> {
  const { id: schemeId, sequelize: database } = scheme;
  await lockScheme(scheme, transaction);
  const place = await placeOnMap(scheme);
  try {
    for (let first = 0; first < buildings.length; first += AT_ONCE) {
      const rows = buildings.slice(first, first + AT_ONCE).map((building) => {
        const { reference, footprint, ...attributes } = building;
        return { reference, attributes, ...placedFootprint(reference, footprint, place) };
      });
      await insertBuildingRows(database, schemeId, rows, transaction);
    }
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    throw new AppError('already-exists', 'Some of these references are in the register already.');
  }
  await scheme.update({ registerVersion: scheme.registerVersion + 1 }, { transaction });
  const subject = { kind: 'register', id: schemeId };
  const after = { buildings: buildings.length, registerVersion: scheme.registerVersion };
  await recordChange({ by, schemeId, action: 'insert buildings', subject, after }, transaction);
}
