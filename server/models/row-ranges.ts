import { QueryTypes, type Sequelize } from 'sequelize';

/** Numbers of rows, both ends with them. */
export type RowRange = { readonly first: number; readonly last: number };

/**
 * The rows of an import in ranges of so many numbers, in the file's order. Ranges with both ends are
 * looked up by the key alone, whatever the database knows of the table.
 */
export async function* rowRanges(
  database: Sequelize,
  importId: string,
  size: number,
): AsyncGenerator<RowRange> {
  const [ends] = await database.query<{ least: number | null; most: number | null }>(
    'select min(row) as least, max(row) as most from import_rows where import_id = $1',
    { type: QueryTypes.SELECT, bind: [importId] },
  );
  const { least, most } = ends ?? { least: null, most: null };
  if (least === null || most === null) return;
  for (let first = least; first <= most; first += size) yield { first, last: first + size - 1 };
}
