import { z } from 'zod';
import { isResultColumn, type ResultColumn } from './result-columns.ts';

/**
 * What the register shows of where a building stands on the assessors' list, for the option of the run that
 * is shown: its state, what is decided or waits for a check, and whose it is.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const STANDING_COLUMNS = {
  state: { label: 'State', kind: 'text' },
  decision: { label: 'Decision', kind: 'text' },
  assignedTo: { label: 'Assessor', kind: 'text' },
} as const;

/**
 * The name of a column of standings.
 *
 * Units: none. Valid: a key of STANDING_COLUMNS. Source: [own].
 */
export type StandingColumn = keyof typeof STANDING_COLUMNS;

/**
 * The columns of standings in order.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const STANDING_COLUMN_NAMES = Object.keys(STANDING_COLUMNS) as readonly StandingColumn[];

/**
 * Whether a column holds where a building stands.
 *
 * Units: none. Valid: any name of a column. Source: [own].
 */
export function isStandingColumn(column: string): column is StandingColumn {
  return Object.hasOwn(STANDING_COLUMNS, column);
}

/**
 * The name of a column that stands beside a building: what a run found of it, or where it stands.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export type BesideColumn = ResultColumn | StandingColumn;

/**
 * Whether a column stands beside a building and is not of its own.
 *
 * Units: none. Valid: any name of a column. Source: [own].
 */
export function isBesideColumn(column: string): column is BesideColumn {
  return isResultColumn(column) || isStandingColumn(column);
}

const text = z.string().nullable();

/**
 * The values of the columns of standings in a row; state is null where the building was not in the run.
 *
 * Units: none. Valid: state of STANDINGS, decision of DECISION_KINDS, assignedTo a person's name.
 * Source: [own].
 */
export const standingColumnsShape = {
  state: text,
  decision: text,
  assignedTo: text,
} as const satisfies Readonly<Record<StandingColumn, z.ZodType>>;
