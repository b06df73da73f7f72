import { changeRegister } from '../../server/commands/change-register.ts';
import { BuildingFootprint, type FootprintRings } from '../../server/models/building-footprint.ts';
import { Building } from '../../server/models/building.ts';
import type { Scheme } from '../../server/models/scheme.ts';
import type {
  CreatedBuilding,
  RegisterCause,
  RegisterEdits,
} from '../../server/register/register-edits.ts';

/** Of EPSG:32631: on its central meridian, so due north is due north. */
export const [E, N] = [500_000, 6_080_000];

/** A rectangle with its south-western corner so far from a corner of the grid, anticlockwise, not closed. */
export function box(east: number, north: number, width = 10, depth = width): FootprintRings {
  const [e, n] = [E + east, N + north];
  return [[[[e, n], [e + width, n], [e + width, n + depth], [e, n + depth]]]]; // prettier-ignore
}

/** A building to bring in: a square of 10 m unless said otherwise. */
export function drawn(reference: string, more: Partial<CreatedBuilding> = {}): CreatedBuilding {
  return { reference, footprint: box(0, 0), attributes: {}, ...more };
}

/** Changes a register in a transaction of its own. */
export function change(
  scheme: Scheme,
  edits: RegisterEdits,
  cause: Partial<RegisterCause> = {},
): ReturnType<typeof changeRegister> {
  const { sequelize: database } = scheme;
  const why = { kind: 'import', by: null, ...cause } as const;
  return database.transaction((transaction) =>
    changeRegister(database, scheme, why, edits, transaction),
  );
}

/** The buildings of a register as they are kept, by reference. */
export function registered(scheme: Scheme): Promise<Building[]> {
  const where = { schemeId: scheme.id, removedAt: null };
  return Building.findAll({ where, order: ['reference'] });
}

/** The footprint of a building as it is kept. */
export async function footprintOf({ id }: { readonly id: number }): Promise<BuildingFootprint> {
  return BuildingFootprint.findByPk(id, { rejectOnEmpty: true });
}
