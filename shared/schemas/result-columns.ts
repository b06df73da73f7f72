import { z } from 'zod';
import { RESULT_VALUES } from './result-values.ts';

/**
 * What the register shows of what the newest complete run found of a building, in the order in which people
 * read it: the figures, whether the category holds over the whole bracket, and what keeps the building from
 * being let go.
 *
 * Units: of RESULT_VALUES, scaled for people. Valid: read only. Source: [own].
 */
export const RESULT_COLUMNS = {
  ...RESULT_VALUES,
  settled: { label: 'Settled', kind: 'text' },
  heldBy: { label: 'Held because', kind: 'text' },
} as const;

/**
 * The name of a column of results.
 *
 * Units: none. Valid: a key of RESULT_COLUMNS. Source: [own].
 */
export type ResultColumn = keyof typeof RESULT_COLUMNS;

/**
 * The columns of results in order.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const RESULT_COLUMN_NAMES = Object.keys(RESULT_COLUMNS) as readonly ResultColumn[];

/**
 * Whether a column holds what a run found.
 *
 * Units: none. Valid: any name of a column. Source: [own].
 */
export function isResultColumn(column: string): column is ResultColumn {
  return Object.hasOwn(RESULT_COLUMNS, column);
}

/**
 * The columns of results that hold one of a few numbers, to be chosen one by one.
 *
 * Units: none. Valid: stages 1 to 3, categories 0 to 4. Source: [own].
 */
export const CLASS_COLUMNS: readonly string[] = [
  'stage',
  'categoryLow',
  'category',
  'categoryHigh',
] satisfies readonly ResultColumn[];

const figure = z.number().nullable();
const text = z.string().nullable();

/**
 * The values of the columns of results in a row; null where the building was not in the run, or was let go
 * before the figure was worked out.
 *
 * Units: of RESULT_COLUMNS. Valid: `settled` is "settled" or "sensitive"; `heldBy` the reasons, one after
 * the other. Source: [own].
 */
export const resultColumnsShape = {
  stage: figure,
  chainage: figure,
  offset: figure,
  categoryLow: figure,
  category: figure,
  categoryHigh: figure,
  strain: figure,
  settlement: figure,
  slope: figure,
  breakpoint: figure,
  reserve: figure,
  settled: text,
  heldBy: text,
} as const satisfies Readonly<Record<ResultColumn, z.ZodType>>;
