import { RESULT_COLUMN_NAMES, type ResultColumn } from '../../shared/schemas/result-columns.ts';
import {
  isResultFigure,
  RESULT_VALUES,
  type ResultFigure,
  type ResultValueFacts,
} from '../../shared/schemas/result-values.ts';
import {
  STANDING_COLUMN_NAMES,
  type StandingColumn,
} from '../../shared/schemas/standing-columns.ts';
import { RECORDED_COLUMNS } from './run-results.ts';

/** The columns of results that hold no figure. */
export type ResultText = Exclude<ResultColumn, ResultFigure>;

const TEXTS: Readonly<Record<ResultText, string>> = {
  settled: `case when r.is_settled then 'settled' when not r.is_settled then 'sensitive' end`,
  heldBy: `nullif(array_to_string(r.held_by, ', '), '')`,
};

/** The SQL of a column of results, in the units of the register, where `r` is a row of results. */
export function resultSql(column: ResultColumn): string {
  if (!isResultFigure(column)) return TEXTS[column];
  const { scale }: ResultValueFacts = RESULT_VALUES[column];
  const recorded = `r.${RECORDED_COLUMNS[column][0]}`;
  const figure = scale === 1 ? recorded : `${recorded} * ${scale}`;
  // of what could not be worked out the record holds nought, which would read as a figure
  return column === 'stage' || column === 'chainage' || column === 'offset'
    ? figure
    : `case when r.fault is null then ${figure} end`;
}

/** What the columns of standings are made of; only what the run has stands anywhere. */
const STANDINGS: Readonly<Record<StandingColumn, string>> = {
  state: `case when r.building_id is not null then coalesce(t.state, 'to decide') end`,
  decision: 't.kind',
  assignedTo: 'p.name',
};

/** The columns beside buildings as a list, each called by its name in what is read. */
export const BESIDE_SELECTION = [
  ...RESULT_COLUMN_NAMES.map((column) => `${resultSql(column)} as "${column}"`),
  ...STANDING_COLUMN_NAMES.map((column) => `${STANDINGS[column]} as "${column}"`),
].join(', ');

/**
 * The buildings `b` with what a run found of them and where they stand for its option; the run's number and
 * the option's in SQL.
 */
export function buildingsBeside(run: string, option: string): string {
  return `buildings b
    left join run_results r on r.run_id = ${run}::uuid and r.building_id = b.id
    left join building_standings t on t.alignment_id = ${option}::uuid and t.building_id = b.id
    left join building_assignments g on g.building_id = b.id
    left join people p on p.id = g.person_id`;
}
