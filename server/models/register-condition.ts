import { STIFF_CONSTRUCTIONS } from '../../shared/building/stiffness-of-construction.ts';
import {
  REGISTER_COLUMNS,
  REGISTER_FIELDS,
  type RegisterColumn,
  type RegisterField,
  type RegisterFilter,
} from '../../shared/schemas/register.ts';
import { isResultColumn } from '../../shared/schemas/result-columns.ts';
import { AppError } from '../errors.ts';
import { NUMBER_COLUMNS, registerColumn, registerField } from './register-columns.ts';
import { buildingsBeside, foundAlone } from './columns-beside.ts';

/** Buildings that are meant, in SQL: where they stand, a condition, and the values that it is asked with. */
export type Condition = {
  readonly from: string;
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

function anySql(field: RegisterField, values: readonly (string | null)[], bind: Bind): string {
  const { name, type } = registerField(field);
  const texts = values.filter((value) => value !== null);
  const known =
    type === 'text'
      ? texts
      : texts
          .filter((text) => text.trim() !== '')
          .map(Number)
          .filter(Number.isFinite);
  const kind = type === 'text' ? 'text' : 'double precision';
  const among = `${name} = any(${bind(known)}::${kind}[])`;
  return values.includes(null) ? `(${among} or ${name} is null)` : among;
}

function rangesSql(ranges: NonNullable<RegisterFilter['ranges']>, bind: Bind): string[] {
  return REGISTER_COLUMNS.flatMap((column) => {
    const range = ranges[column];
    if (range === undefined) return [];
    if (!NUMBER_COLUMNS.has(column)) {
      const message = 'Only numbers have a range.';
      throw new AppError('invalid-input', undefined, [
        { path: `filter.ranges.${column}`, message },
      ]);
    }
    const { name } = registerColumn(column);
    return [
      ...(range.from === undefined ? [] : [`${name} >= ${bind(range.from)}::double precision`]),
      ...(range.to === undefined ? [] : [`${name} <= ${bind(range.to)}::double precision`]),
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

/** What a run found, of all its buildings: also of those that are no longer in the register. */
export function resultsAlone(runId: string | null): Condition {
  return { from: foundAlone('$1'), where: 'true', bind: [runId] };
}

/** Whether a filter, or a column beside it, hangs on what a run found. */
export function asksResults(filter: RegisterFilter, column?: RegisterColumn): boolean {
  const { any = {}, ranges = {}, unknown = [] } = filter;
  const asked = [
    ...Object.keys(any),
    ...Object.keys(ranges),
    ...unknown,
    ...(column ? [column] : []),
  ];
  return asked.some(isResultColumn);
}

/**
 * The buildings of a register that a filter means; `column` is what else will be asked of them. Results are
 * looked up only where they are asked for. What a filter asks of standings is split off before.
 */
export function registerCondition(
  register: RegisterOf,
  filter: RegisterFilter,
  column?: RegisterColumn,
): Condition {
  const values: unknown[] = [register.schemeId];
  const bind: Bind = (value) => `$${values.push(value)}`;
  const from = asksResults(filter, column)
    ? buildingsBeside({ run: bind(register.runId) })
    : 'buildings';
  const { search, any = {}, ranges = {}, unknown = [], assumed } = filter;
  const conditions = ['scheme_id = $1', 'removed_at is null'];
  if (search !== undefined && search !== '') {
    conditions.push(`words @@ ${wantedWords(bind(search))}`);
  }
  for (const field of REGISTER_FIELDS) {
    const wanted = any[field];
    if (wanted !== undefined) conditions.push(anySql(field, wanted, bind));
  }
  conditions.push(...rangesSql(ranges, bind));
  conditions.push(...unknown.map((field) => `${registerField(field).name} is null`));
  if (assumed !== undefined) {
    conditions.push(assumed ? assumedSql(bind) : `not ${assumedSql(bind)}`);
  }
  conditions.push(...placeSql(filter, bind));
  return { from, where: conditions.join('\n and '), bind: values };
}
