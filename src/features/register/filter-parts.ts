import {
  REGISTER_COLUMNS,
  type RegisterColumn,
  type RegisterField,
  type RegisterFilter,
} from '../../../shared/schemas/register.ts';

/** What a filter can ask for beside words: one chip each. */
export type FilterPart =
  | Exclude<RegisterColumn, 'reference'>
  | 'assumed'
  | 'within'
  | 'inside'
  | 'importId'
  | 'ids'
  | 'except';

/** The parts that always have a chip. */
export const STANDING_PARTS = ['use', 'listedGrade', 'construction', 'condition'] as const;

const BESIDE_FIELDS = ['assumed', 'within', 'inside', 'importId', 'ids', 'except'] as const;

/** The columns that can be filtered by. */
export const FILTER_COLUMNS = REGISTER_COLUMNS.filter((column) => column !== 'reference');

/** Every part there is, in order. */
export const FILTER_PARTS: readonly FilterPart[] = [...FILTER_COLUMNS, ...BESIDE_FIELDS];

type BesideFields = (typeof BESIDE_FIELDS)[number];

export function isBesideFields(part: FilterPart): part is BesideFields {
  return BESIDE_FIELDS.some((one) => one === part);
}

/** What a filter says of one column. */
export type ColumnFilter = {
  readonly any?: readonly (string | null)[] | undefined;
  readonly range?:
    { readonly from?: number | undefined; readonly to?: number | undefined } | undefined;
  readonly unknown?: boolean;
};

export function columnFilter(filter: RegisterFilter, column: RegisterField | 'area'): ColumnFilter {
  if (column === 'area') return { range: filter.ranges?.area };
  return {
    any: filter.any?.[column],
    range: filter.ranges?.[column],
    unknown: filter.unknown?.includes(column) === true,
  };
}

/** Whether a filter asks for something here. */
export function isSet(filter: RegisterFilter, part: FilterPart): boolean {
  if (isBesideFields(part)) return filter[part] !== undefined;
  const { any, range, unknown } = columnFilter(filter, part);
  return any !== undefined || range !== undefined || unknown === true;
}

function orNothing<T extends object>(parts: T): T | undefined {
  return Object.values(parts).some((value) => value !== undefined) ? parts : undefined;
}

/** Leaves out what asks for nothing, so that the same filter is always written alike. */
function tidy(filter: RegisterFilter): RegisterFilter {
  const { search, any, ranges, unknown, ...rest } = filter;
  const parts = {
    ...rest,
    search: search === '' ? undefined : search,
    any: any && orNothing(any),
    ranges: ranges && orNothing(ranges),
    unknown: unknown?.length === 0 ? undefined : unknown,
  };
  const entries = Object.entries(parts).filter(([, value]) => value !== undefined);
  return Object.fromEntries(entries);
}

/** The filter with something else asked of one column. */
export function withColumn(
  filter: RegisterFilter,
  column: RegisterField | 'area',
  { any, range, unknown = false }: ColumnFilter,
): RegisterFilter {
  const isRange = range?.from !== undefined || range?.to !== undefined;
  const ranges = { ...filter.ranges, [column]: isRange ? range : undefined };
  if (column === 'area') return tidy({ ...filter, ranges });
  const others = filter.unknown?.filter((one) => one !== column) ?? [];
  return tidy({
    ...filter,
    any: { ...filter.any, [column]: any === undefined || any.length === 0 ? undefined : [...any] },
    ranges,
    unknown: unknown ? [...others, column] : others,
  });
}

/** The filter with another of what is beside its columns; undefined asks for nothing there. */
export function withBeside(
  filter: RegisterFilter,
  change: Partial<Pick<RegisterFilter, BesideFields | 'search'>>,
): RegisterFilter {
  return tidy({ ...filter, ...change });
}

/** The filter that asks for nothing here. */
export function without(filter: RegisterFilter, part: FilterPart): RegisterFilter {
  return isBesideFields(part)
    ? withBeside(filter, { [part]: undefined })
    : withColumn(filter, part, {});
}
