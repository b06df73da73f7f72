import { AppError } from '../errors.ts';
import { Building } from './building.ts';

/** A building of a scheme's register; one of another scheme, or taken out, answers like none. */
export async function findBuilding(schemeId: string, id: number): Promise<Building> {
  const building = await findBuildingEverKept(schemeId, id);
  if (building.removedAt !== null) throw new AppError('not-found');
  return building;
}

/** The same, even where it was taken out: its history stays. */
export async function findBuildingEverKept(schemeId: string, id: number): Promise<Building> {
  const building = await Building.findOne({ where: { id, schemeId } });
  if (building === null) throw new AppError('not-found');
  return building;
}
