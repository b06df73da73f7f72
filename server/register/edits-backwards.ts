import type { Sequelize, Transaction } from 'sequelize';
import { z } from 'zod';
import {
  BUILDING_FIELD_NAMES,
  buildingAttributesSchema,
  footprintSchema,
} from '../../shared/schemas/building-fields.ts';
import { GROUND_LEVEL_FROM } from '../../shared/schemas/register.ts';
import type { BuildingChange } from '../models/building-changes.ts';
import { findBuildingChanges } from '../models/find-building-changes.ts';
import type { ChangedBuilding, RegisterEdits } from './register-edits.ts';

const AT_ONCE = 2000;

/** What a history keeps of values beside the fields. */
const keptSchema = z.object({
  reference: z.string().optional(),
  footprint: footprintSchema.optional(),
  groundLevelFrom: z.enum(GROUND_LEVEL_FROM).nullable().optional(),
  imported: z.record(z.string(), z.union([z.string(), z.number(), z.null()])).optional(),
});

function asItWas({ buildingId: id, version, before }: BuildingChange): ChangedBuilding {
  const fields = Object.entries(before ?? {}).filter(([name]) =>
    BUILDING_FIELD_NAMES.some((field) => field === name),
  );
  const attributes = buildingAttributesSchema.parse(Object.fromEntries(fields));
  return { id, version, attributes, ...keptSchema.parse(before) };
}

/** What takes a change back, read while it is written. */
export function editsBackwards(
  database: Sequelize,
  changeId: string,
  transaction: Transaction,
): RegisterEdits {
  async function* each(): AsyncGenerator<BuildingChange> {
    let after = 0;
    for (;;) {
      const page = { after, limit: AT_ONCE };
      const rows = await findBuildingChanges(database, changeId, page, transaction);
      yield* rows;
      const last = rows.at(-1);
      if (last === undefined || rows.length < AT_ONCE) return;
      after = last.buildingId;
    }
  }
  async function* some<T>(
    isMeant: (row: BuildingChange) => boolean,
    edit: (row: BuildingChange) => T,
  ): AsyncGenerator<T> {
    for await (const row of each()) if (isMeant(row)) yield edit(row);
  }
  const seen = ({ buildingId, version }: BuildingChange) => ({ id: buildingId, version });
  return {
    removed: some(({ before }) => before === null, seen),
    changed: some(({ before, after }) => before !== null && after !== null, asItWas),
    restored: some(({ after }) => after === null, seen),
  };
}
