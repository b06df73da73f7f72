import type { Sequelize, Transaction } from 'sequelize';
import type { BackgroundLayer } from '../../shared/schemas/background.ts';
import type { BackgroundRow } from '../importers/read-background.ts';

/** Inserts features of a layer by the column, which is many times faster than by the row. */
export async function insertBackgroundRows(
  database: Sequelize,
  { schemeId, layer }: { readonly schemeId: string; readonly layer: BackgroundLayer },
  rows: readonly BackgroundRow[],
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into background_features (scheme_id, layer, name, geometry, west, south, east, north)
     select $1, $2, given.* from unnest($3::text[], $4::jsonb[], $5::double precision[],
       $6::double precision[], $7::double precision[], $8::double precision[]) as given`,
    {
      bind: [
        schemeId,
        layer,
        rows.map(({ name }) => name),
        rows.map(({ geometry }) => JSON.stringify(geometry)),
        rows.map(({ bounds }) => bounds.west),
        rows.map(({ bounds }) => bounds.south),
        rows.map(({ bounds }) => bounds.east),
        rows.map(({ bounds }) => bounds.north),
      ],
      transaction,
    },
  );
}
