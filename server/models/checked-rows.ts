import { QueryTypes, type Sequelize } from 'sequelize';
import type { Box } from '../../shared/geometry/bounding-box.ts';
import type { BuildingAttributes } from '../../shared/schemas/building-fields.ts';
import type { ImportRow } from '../../shared/schemas/imports.ts';
import type { FootprintRings } from './building-footprint.ts';
import type { ImportedValues } from './building-state.ts';
import type { RowRange } from './row-ranges.ts';

/** What confirming takes over of a row. */
export type Taking = {
  readonly attributes: BuildingAttributes;
  readonly takesFootprint: boolean;
  readonly imported: ImportedValues;
  /** Of the building that was seen; null where there was none. */
  readonly version: number | null;
};

/** What a check made of a row. */
export type CheckedRow = Pick<
  ImportRow,
  'row' | 'reference' | 'outcome' | 'remarks' | 'changes' | 'area' | 'isMended'
> & {
  readonly footprint: FootprintRings | null;
  readonly lonLat: FootprintRings | null;
  readonly box: Box | null;
  readonly buildingId: number | null;
  readonly taking: Taking | null;
};

type Column = readonly [name: string, type: string, value: (row: CheckedRow) => unknown];

function json(name: string, value: (row: CheckedRow) => unknown): Column {
  return [
    name,
    'jsonb',
    (row) => {
      const given = value(row);
      return given === null ? null : JSON.stringify(given);
    },
  ];
}

const COLUMNS: readonly Column[] = [
  ['reference', 'text', ({ reference }) => reference],
  ['outcome', 'text', ({ outcome }) => outcome],
  json('remarks', ({ remarks }) => remarks),
  json('changes', ({ changes }) => changes),
  ['area', 'double precision', ({ area }) => area],
  ['is_mended', 'boolean', ({ isMended }) => isMended],
  json('footprint', ({ footprint }) => footprint),
  json('lon_lat', ({ lonLat }) => lonLat),
  ['west', 'double precision', ({ box }) => box?.west ?? null],
  ['south', 'double precision', ({ box }) => box?.south ?? null],
  ['east', 'double precision', ({ box }) => box?.east ?? null],
  ['north', 'double precision', ({ box }) => box?.north ?? null],
  ['building_id', 'integer', ({ buildingId }) => buildingId],
  json('taking', ({ taking }) => taking),
];

const NAMES = COLUMNS.map(([name]) => name);
const SETS = NAMES.map((name) => `${name} = given.${name}`).join(', ');
const LISTS = COLUMNS.map(([, type], index) => `$${index + 3}::${type}[]`).join(', ');

/**
 * Keeps what a check made of some rows, in the file's order, in place of what an earlier one did. Their
 * range is told besides, so that no other rows are looked at.
 */
export async function writeCheckedRows(
  database: Sequelize,
  importId: string,
  rows: readonly CheckedRow[],
): Promise<void> {
  await database.query(
    `update import_rows as kept set ${SETS}
     from unnest($2::integer[], ${LISTS}) as given(row, ${NAMES.join(', ')})
     where kept.import_id = $1 and kept.row = given.row
       and kept.row between $2[1] and $2[array_upper($2, 1)]`,
    {
      bind: [
        importId,
        rows.map(({ row }) => row),
        ...COLUMNS.map(([, , value]) => rows.map(value)),
      ],
    },
  );
}

/** Adds remarks to rows that have been checked. */
export async function addRemarks(
  database: Sequelize,
  importId: string,
  remarks: readonly { readonly row: number; readonly remark: string }[],
): Promise<void> {
  await database.query(
    `update import_rows as kept set remarks = kept.remarks || given.more
     from (select row, jsonb_agg(remark) as more
           from unnest($2::integer[], $3::text[]) as one(row, remark) group by row) as given
     where kept.import_id = $1 and kept.row = given.row`,
    { bind: [importId, remarks.map(({ row }) => row), remarks.map(({ remark }) => remark)] },
  );
}

/** A row with what is to be taken over of it. */
export type TakenRow = {
  readonly row: number;
  readonly reference: string;
  readonly buildingId: number | null;
  readonly footprint: FootprintRings | null;
  readonly taking: Taking;
};

/** The rows of an import in a range of which something is to be taken over: of new buildings, or of others. */
export async function findTakenRows(
  database: Sequelize,
  importId: string,
  { first, last }: RowRange,
  isNew: boolean,
): Promise<TakenRow[]> {
  return database.query<TakenRow>(
    `select row, reference, building_id as "buildingId", taking,
       case when (taking->>'takesFootprint')::boolean then footprint end as footprint
     from import_rows
     where import_id = $1 and row between $2 and $3
       and taking is not null and (building_id is null) = $4
     order by row`,
    { type: QueryTypes.SELECT, bind: [importId, first, last, isNew] },
  );
}
