import { STIFF_CONSTRUCTIONS } from '../../shared/building/stiffness-of-construction.ts';
import { BUILDING_FIELD_NAMES, type BuildingField } from '../../shared/schemas/building-fields.ts';
import type { RegisterColumn, RegisterFilter } from '../../shared/schemas/register.ts';
import { isBesideColumn } from '../../shared/schemas/standing-columns.ts';
import { AppError } from '../errors.ts';
import { BUILDING_COLUMNS } from './building-columns.ts';
import { NUMBER_COLUMNS, OWN_COLUMNS, ownColumn } from './register-columns.ts';

/** Buildings that are meant, in SQL: a condition, and the values that it is asked with. */
export type Condition = {
  readonly where: string;
  readonly bind: readonly unknown[];
};

/** A register: that of a scheme, with the results of one of its runs, of one of its options, or of none. */
export type RegisterOf = {
  readonly schemeId: string;
  readonly runId: string | null;
  readonly optionId: string | null;
};

type Bind = (value: unknown) => string;

function wantedWords(given: string): string {
  return `(select string_agg('''' || word || ''':*', ' & ')::tsquery
    from unnest(tsvector_to_array(folded_words(${given}))) as word)`;
}

/** As knownOfBuilding and completeAttributes tell it: something of these is not known. */
function assumedSql(bind: Bind): string {
  const stiff = `coalesce(lower(btrim(replace(construction, '-', ' '))) = any(${bind(STIFF_CONSTRUCTIONS)}::text[]), false)`;
  return `(storeys is null or eaves_height is null
    or coalesce(ground_level <= founding_level, true)
    or ((e_over_g is null or poisson is null) and not ${stiff}))`;
}

/** The numbers that are among some texts, as filters write them. */
export function numbersAmong(texts: readonly (string | null)[]): number[] {
  return texts
    .filter((text) => text !== null && text.trim() !== '')
    .map(Number)
    .filter(Number.isFinite);
}

function anySql(field: BuildingField, values: readonly (string | null)[], bind: Bind): string {
  const { name, type } = BUILDING_COLUMNS[field];
  const known = type === 'text' ? values.filter((value) => value !== null) : numbersAmong(values);
  const kind = type === 'text' ? 'text' : 'double precision';
  const among = `${name} = any(${bind(known)}::${kind}[])`;
  return values.includes(null) ? `(${among} or ${name} is null)` : among;
}

/** The range that a filter asks of a column; only numbers have one. */
export function rangeOf(
  { ranges = {} }: RegisterFilter,
  column: RegisterColumn,
): { readonly from?: number | undefined; readonly to?: number | undefined } | undefined {
  const range = ranges[column];
  if (range === undefined || NUMBER_COLUMNS.has(column)) return range;
  const message = 'Only numbers have a range.';
  throw new AppError('invalid-input', undefined, [{ path: `filter.ranges.${column}`, message }]);
}

function rangesSql(filter: RegisterFilter, bind: Bind): string[] {
  return OWN_COLUMNS.flatMap((column) => {
    const { from, to } = rangeOf(filter, column) ?? {};
    const { name } = ownColumn(column);
    return [
      ...(from === undefined ? [] : [`${name} >= ${bind(from)}::double precision`]),
      ...(to === undefined ? [] : [`${name} <= ${bind(to)}::double precision`]),
    ];
  });
}

type Box = readonly [west: string, south: string, east: string, north: string];

function boxSql(degrees: readonly number[], bind: Bind): Box {
  const [west = '', south = '', east = '', north = ''] = degrees.map(
    (value) => `${bind(value)}::double precision`,
  );
  return [west, south, east, north];
}

function meetsSql([west, south, east, north]: Box): string {
  return `box(point(west, south), point(east, north)) && box(point(${west}, ${south}), point(${east}, ${north}))`;
}

/** The database takes products of sides under a millionth for nothing, which in degrees swallows houses. */
const FINE = 1e6;

/** The box comes first, since it is what has an index. */
function insideSql(outline: NonNullable<RegisterFilter['inside']>, bind: Bind): string[] {
  const [longitudes, latitudes] = [
    outline.map(([east]) => east),
    outline.map(([, north]) => north),
  ];
  const [least, lowest] = [Math.min(...longitudes), Math.min(...latitudes)];
  const box = boxSql([least, lowest, Math.max(...longitudes), Math.max(...latitudes)], bind);
  const corners = outline.map(([east, north]) => {
    return `(${(east - least) * FINE},${(north - lowest) * FINE})`;
  });
  const middle = `point(((west + east) / 2 - ${box[0]}) * ${FINE}, ((south + north) / 2 - ${box[1]}) * ${FINE})`;
  return [meetsSql(box), `${bind(`(${corners.join(',')})`)}::polygon @> ${middle}`];
}

function placeSql({ within, inside, ids, except, importId }: RegisterFilter, bind: Bind): string[] {
  const conditions: string[] = [];
  if (within !== undefined) conditions.push(meetsSql(boxSql(within, bind)));
  if (inside !== undefined) conditions.push(...insideSql(inside, bind));
  if (ids !== undefined) conditions.push(`id = any(${bind(ids)}::integer[])`);
  if (except !== undefined) conditions.push(`id <> all(${bind(except)}::integer[])`);
  if (importId !== undefined) {
    conditions.push(`id in (select c.building_id from building_changes c
      join register_changes r on r.id = c.change_id where r.import_id = ${bind(importId)}::uuid)`);
  }
  return conditions;
}

/** The buildings of a register that a filter means. What it asks beside them is split off before. */
export function registerCondition(
  { schemeId }: Pick<RegisterOf, 'schemeId'>,
  filter: RegisterFilter,
): Condition {
  const values: unknown[] = [schemeId];
  const bind: Bind = (value) => `$${values.push(value)}`;
  const { search, any = {}, unknown = [], assumed } = filter;
  const conditions = ['scheme_id = $1', 'removed_at is null'];
  if (search !== undefined && search !== '') {
    conditions.push(`words @@ ${wantedWords(bind(search))}`);
  }
  for (const field of BUILDING_FIELD_NAMES) {
    const wanted = any[field];
    if (wanted !== undefined) conditions.push(anySql(field, wanted, bind));
  }
  conditions.push(...rangesSql(filter, bind));
  const unknownOwn = unknown.filter((field) => !isBesideColumn(field));
  conditions.push(...unknownOwn.map((field) => `${BUILDING_COLUMNS[field].name} is null`));
  if (assumed !== undefined) {
    conditions.push(assumed ? assumedSql(bind) : `not ${assumedSql(bind)}`);
  }
  conditions.push(...placeSql(filter, bind));
  return { where: conditions.join('\n and '), bind: values };
}
