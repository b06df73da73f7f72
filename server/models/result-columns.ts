import {
  RESULT_COLUMN_NAMES,
  RESULT_COLUMNS,
  type ResultColumn,
} from '../../shared/schemas/result-columns.ts';
import {
  isResultFigure,
  RESULT_VALUES,
  type ResultFigure,
  type ResultValueFacts,
} from '../../shared/schemas/result-values.ts';
import type { BuildingColumn } from './building-columns.ts';
import { RECORDED_COLUMNS } from './run-results.ts';

/** What the columns are made of that hold no figure. */
const TEXTS: Readonly<Record<Exclude<ResultColumn, ResultFigure>, string>> = {
  settled: `case when r.is_settled then 'settled' when not r.is_settled then 'sensitive' end`,
  heldBy: `nullif(array_to_string(r.held_by, ', '), '')`,
};

function nameOf(column: ResultColumn): string {
  return isResultFigure(column) ? RECORDED_COLUMNS[column][0] : `result_${column}`;
}

function valueSql(column: ResultColumn): string {
  if (!isResultFigure(column)) return TEXTS[column];
  const { scale }: ResultValueFacts = RESULT_VALUES[column];
  const recorded = `r.${RECORDED_COLUMNS[column][0]}`;
  const figure = scale === 1 ? recorded : `${recorded} * ${scale}`;
  // of what could not be worked out the record holds nought, which would read as a figure
  return column === 'stage' ? figure : `case when r.fault is null then ${figure} end`;
}

/** Where each column of results is found beside the columns of a building. */
export function resultColumn(column: ResultColumn): BuildingColumn {
  const { kind } = RESULT_COLUMNS[column];
  const type = kind === 'text' ? 'text' : kind === 'whole' ? 'integer' : 'double precision';
  return { name: nameOf(column), type };
}

const COLUMNS = RESULT_COLUMN_NAMES.map(
  (column) => `${valueSql(column)} as ${nameOf(column)}`,
).join(', ');

/**
 * The buildings with what a run found of them, in the units of the register; `run` is the SQL of the run's
 * number, or of null. What is not asked for is not looked up.
 */
export function buildingsWithResults(run: string): string {
  return `(select b.*, ${COLUMNS} from buildings b
    left join run_results r on r.run_id = ${run}::uuid and r.building_id = b.id) as buildings`;
}

/** The columns of results as a list, each called by its name in what is read. */
export const RESULT_SELECTION = RESULT_COLUMN_NAMES.map(
  (column) => `${nameOf(column)} as "${column}"`,
).join(', ');
