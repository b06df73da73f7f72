import { QueryTypes, type Sequelize } from 'sequelize';
import {
  BUILDING_FIELD_NAMES,
  type BuildingAttributes,
} from '../../shared/schemas/building-fields.ts';
import type { ManyPreview } from '../../shared/schemas/register-changes.ts';
import { BUILDING_COLUMNS } from './building-columns.ts';
import type { Condition } from './register-condition.ts';

/** How many of the buildings that are meant have each of some values, and how many have none there. */
export async function countValues(
  database: Sequelize,
  { where, bind }: Condition,
  attributes: BuildingAttributes,
): Promise<ManyPreview> {
  const values: unknown[] = [...bind];
  const fields = BUILDING_FIELD_NAMES.filter((field) => attributes[field] !== undefined);
  const counts = fields.flatMap((field) => {
    const { name, type } = BUILDING_COLUMNS[field];
    const same = `${name} is not distinct from $${values.push(attributes[field])}::${type}`;
    return [
      `count(*) filter (where ${same})::integer as "${field} same"`,
      `count(*) filter (where ${name} is null)::integer as "${field} unknown"`,
    ];
  });
  const [row = {}] = await database.query<Record<string, number>>(
    `select ${counts.join(', ')} from buildings where ${where}`,
    { type: QueryTypes.SELECT, bind: values },
  );
  return fields.map((field) => ({
    field,
    same: row[`${field} same`] ?? 0,
    unknown: row[`${field} unknown`] ?? 0,
  }));
}
