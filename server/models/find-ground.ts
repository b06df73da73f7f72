import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { GroundAnswer } from '../../shared/schemas/ground.ts';
import type { FootprintRings } from './building-footprint.ts';

/** How many buildings have their ground level from where. */
export async function countLevels(
  database: Sequelize,
  schemeId: string,
): Promise<GroundAnswer['buildings']> {
  const [row] = await database.query<GroundAnswer['buildings']>(
    `select count(*) filter (where ground_level_from = 'ground')::integer as "fromGround",
       count(*) filter (where ground_level_from = 'file')::integer as "fromFile",
       count(*) filter (where ground_level_from = 'hand')::integer as "byHand",
       count(*) filter (where ground_level is null)::integer as unknown
     from buildings where scheme_id = $1 and removed_at is null`,
    { type: QueryTypes.SELECT, bind: [schemeId] },
  );
  return row ?? { fromGround: 0, fromFile: 0, byHand: 0, unknown: 0 };
}

export type LevelledBuilding = {
  readonly id: number;
  readonly version: number;
  readonly groundLevel: number | null;
  readonly footprint: FootprintRings;
};

const AT_ONCE = 2000;

/** The buildings whose ground level the scheme's ground gives: unknown, or from the ground before. */
export async function* findLevelled(
  database: Sequelize,
  schemeId: string,
  transaction: Transaction,
): AsyncGenerator<LevelledBuilding> {
  let after = 0;
  for (;;) {
    const rows: LevelledBuilding[] = await database.query<LevelledBuilding>(
      `select id, version, ground_level as "groundLevel", footprint
       from buildings join building_footprints on building_id = id
       where scheme_id = $1 and removed_at is null and id > $2
         and (ground_level is null or ground_level_from = 'ground')
       order by id limit ${AT_ONCE}`,
      { type: QueryTypes.SELECT, bind: [schemeId, after], transaction },
    );
    yield* rows;
    const last = rows.at(-1);
    if (last === undefined) return;
    after = last.id;
  }
}
