import type { RegisterFilter, RegisterSort } from '../../shared/schemas/register.ts';
import { isBesideColumn, type BesideColumn } from '../../shared/schemas/standing-columns.ts';
import { NUMBER_COLUMNS } from '../models/register-columns.ts';
import { numbersAmong, rangeOf } from '../models/register-condition.ts';
import type { Value } from './ranked.ts';

/** What a filter asks of one column beside buildings. */
export type AskedBeside = {
  readonly column: BesideColumn;
  readonly isMeant: (value: Value | null) => boolean;
};

/** Buildings and an order of them. */
export type Which = { readonly filter: RegisterFilter; readonly sort: RegisterSort };

/** The columns beside buildings that a filter asks something of, each once. */
function columnsAsked({ any = {}, ranges = {}, unknown = [] }: RegisterFilter): BesideColumn[] {
  const asked = new Set<string>([...Object.keys(any), ...Object.keys(ranges), ...unknown]);
  return [...asked].filter(isBesideColumn);
}

/** The columns beside buildings that these are chosen or ordered by. */
export function columnsBeside({ filter, sort: { column } }: Which): BesideColumn[] {
  return [...columnsAsked(filter), ...(isBesideColumn(column) ? [column] : [])];
}

function askedOf(filter: RegisterFilter, column: BesideColumn): AskedBeside {
  const { any: { [column]: texts } = {}, unknown = [] } = filter;
  const range = rangeOf(filter, column);
  const { from = -Infinity, to = Infinity } = range ?? {};
  const known = NUMBER_COLUMNS.has(column) ? numbersAmong(texts ?? []) : (texts ?? []);
  const values = new Set<Value | null>(texts?.includes(null) === true ? [...known, null] : known);
  return {
    column,
    isMeant: (value) =>
      (texts === undefined || values.has(value)) &&
      (range === undefined || (typeof value === 'number' && value >= from && value <= to)) &&
      (value === null || !unknown.includes(column)),
  };
}

function without<T extends object>(
  asked: T | undefined,
  isLeftOut: (column: string) => boolean,
): T | undefined {
  const kept = Object.entries(asked ?? {}).filter(([column]) => !isLeftOut(column));
  return kept.length === 0 ? undefined : (Object.fromEntries(kept) as T);
}

/** A filter in two: what it asks of some of the columns beside buildings, and the rest. */
export function splitFilter(
  filter: RegisterFilter,
  isSplitOff: (column: string) => boolean,
): { readonly rest: RegisterFilter; readonly asked: readonly AskedBeside[] } {
  const columns = columnsAsked(filter).filter(isSplitOff);
  if (columns.length === 0) return { rest: filter, asked: [] };
  const { any, ranges, unknown, ...others } = filter;
  const kept = {
    any: without(any, isSplitOff),
    ranges: without(ranges, isSplitOff),
    unknown: unknown?.filter((column) => !isSplitOff(column)),
  };
  const rest = {
    ...others,
    ...(kept.any && { any: kept.any }),
    ...(kept.ranges && { ranges: kept.ranges }),
    ...(kept.unknown && kept.unknown.length > 0 && { unknown: kept.unknown }),
  };
  return { rest, asked: columns.map((column) => askedOf(filter, column)) };
}
