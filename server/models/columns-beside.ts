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
import {
  STANDING_COLUMN_NAMES,
  type StandingColumn,
} from '../../shared/schemas/standing-columns.ts';
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
  return column === 'stage' || column === 'chainage' || column === 'offset'
    ? figure
    : `case when r.fault is null then ${figure} end`;
}

/** Where each column of results is found beside the columns of a building. */
export function resultColumn(column: ResultColumn): BuildingColumn {
  const { kind } = RESULT_COLUMNS[column];
  const type = kind === 'text' ? 'text' : kind === 'whole' ? 'integer' : 'double precision';
  return { name: nameOf(column), type };
}

const RESULTS = RESULT_COLUMN_NAMES.map((column) => `${valueSql(column)} as ${nameOf(column)}`);

/** What the columns of standings are made of; only what the run has stands anywhere. */
const STANDINGS: Readonly<Record<StandingColumn, string>> = {
  state: `case when r.building_id is not null then coalesce(t.state, 'to decide') end`,
  decision: 't.kind',
  assignedTo: 'p.name',
};

/** Where each column of standings is found beside the columns of a building. */
export function standingColumn(column: StandingColumn): BuildingColumn {
  return { name: `standing_${column}`, type: 'text' };
}

const OF_STANDINGS = STANDING_COLUMN_NAMES.map(
  (column) => `${STANDINGS[column]} as ${standingColumn(column).name}`,
);

/** What stands beside buildings: the SQL of the run's number and of its option's, or of null. */
export type Beside = { readonly run: string; readonly option?: string };

/**
 * The buildings with what a run found of them, in the units of the register, and where they stand for its
 * option where that is asked for. What is not asked for is not looked up.
 */
export function buildingsBeside({ run, option }: Beside): string {
  const results = `left join run_results r on r.run_id = ${run}::uuid and r.building_id = b.id`;
  if (option === undefined) {
    return `(select ${['b.*', ...RESULTS].join(', ')} from buildings b ${results}) as buildings`;
  }
  return `(select ${['b.*', ...RESULTS, ...OF_STANDINGS].join(', ')} from buildings b ${results}
    left join building_standings t on t.alignment_id = ${option}::uuid and t.building_id = b.id
    left join building_assignments g on g.building_id = b.id
    left join people p on p.id = g.person_id) as buildings`;
}

/** What a run found, in the units of the register, by the buildings' numbers alone; its number in SQL. */
export function foundAlone(run: string): string {
  return `(select r.building_id as id, ${RESULTS.join(', ')} from run_results r
    where r.run_id = ${run}::uuid) as found`;
}

/** The columns beside buildings as a list, each called by its name in what is read. */
export const BESIDE_SELECTION = [
  ...RESULT_COLUMN_NAMES.map((column) => `${nameOf(column)} as "${column}"`),
  ...STANDING_COLUMN_NAMES.map((column) => `${standingColumn(column).name} as "${column}"`),
].join(', ');
