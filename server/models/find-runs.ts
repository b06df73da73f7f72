import { QueryTypes, type Sequelize } from 'sequelize';
import { AppError } from '../errors.ts';
import { SHOWN_RUN } from './find-shown-run.ts';

/** A run with where it stands and what has changed since, as its presenter wants it. */
export type FoundRun = {
  readonly id: string;
  readonly number: number;
  readonly alignmentId: string;
  readonly alignmentVersion: number;
  readonly optionName: string;
  readonly rulesVersion: number;
  readonly registerVersion: number;
  readonly methodVersion: string;
  readonly buildings: number;
  readonly startedAt: Date;
  readonly startedBy: string | null;
  readonly state: string;
  readonly endedAt: Date | null;
  readonly fault: string | null;
  readonly done: number;
  readonly registerChanged: boolean;
  readonly optionChanged: boolean;
  readonly rulesChanged: boolean;
  readonly isShown: boolean;
};

const MOST = 100;

const RUNS = `
  select r.id, r.number, r.alignment_id as "alignmentId", r.alignment_version as "alignmentVersion",
    r.option_name as "optionName", r.rules_version as "rulesVersion",
    r.register_version as "registerVersion", r.method_version as "methodVersion", r.buildings,
    r.started_at as "startedAt", p.name as "startedBy", s.state, s.ended_at as "endedAt", s.fault,
    coalesce((
      select sum(cardinality(c.members)) from run_chunks c
      where c.run_id = r.id and c.done_at is not null
    ), 0)::integer as done,
    scheme.register_version <> r.register_version as "registerChanged",
    a.design is distinct from r.design as "optionChanged",
    (select max(version) from scheme_rules where scheme_id = r.scheme_id) <> r.rules_version
      as "rulesChanged",
    coalesce(r.id = (${SHOWN_RUN}), false) as "isShown"
  from runs r
  join run_states s on s.run_id = r.id
  join schemes scheme on scheme.id = r.scheme_id
  left join alignments a on a.id = r.alignment_id
  left join people p on p.id = r.started_by
  where r.scheme_id = $1`;

/** The newest runs of a scheme, the newest first. */
export function findRuns(database: Sequelize, schemeId: string): Promise<FoundRun[]> {
  return database.query<FoundRun>(`${RUNS} order by r.number desc limit ${MOST}`, {
    type: QueryTypes.SELECT,
    bind: [schemeId],
  });
}

/** One run of a scheme; of another scheme it is not there. */
export async function findRun(
  database: Sequelize,
  schemeId: string,
  id: string,
): Promise<FoundRun> {
  const [run] = await database.query<FoundRun>(`${RUNS} and r.id = $2`, {
    type: QueryTypes.SELECT,
    bind: [schemeId, id],
  });
  if (run === undefined) throw new AppError('not-found');
  return run;
}
