import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { RunProgress } from '../../shared/schemas/runs.ts';
import type { Chunk } from '../runs/plan-chunks.ts';

/** Writes down how a run is cut. */
export async function insertChunks(
  database: Sequelize,
  runId: string,
  chunks: readonly Chunk[],
  transaction: Transaction,
): Promise<void> {
  const rows = chunks.map((chunk, index) => ({ chunk: index, ...chunk }));
  await database.query(
    `insert into run_chunks (run_id, chunk, members, beside)
     select $1, chunk, members, beside
     from jsonb_to_recordset($2::jsonb) as given (chunk integer, members integer[], beside integer[])`,
    { bind: [runId, JSON.stringify(rows)], transaction },
  );
}

/** A part of a run that is still to be done; undefined once it is. */
export async function findOpenChunk(
  database: Sequelize,
  { runId, chunk }: { readonly runId: string; readonly chunk: number },
): Promise<Chunk | undefined> {
  const [row] = await database.query<Chunk>(
    'select members, beside from run_chunks where run_id = $1 and chunk = $2 and done_at is null',
    { type: QueryTypes.SELECT, bind: [runId, chunk] },
  );
  return row;
}

/** The parts of a run that are still to be done. */
export async function findOpenChunks(
  database: Sequelize,
  runId: string,
  transaction: Transaction,
): Promise<number[]> {
  const rows = await database.query<{ chunk: number }>(
    'select chunk from run_chunks where run_id = $1 and done_at is null order by chunk',
    { type: QueryTypes.SELECT, bind: [runId], transaction },
  );
  return rows.map(({ chunk }) => chunk);
}

/** Whether a run has been cut into parts; of no buildings there are none. */
export async function hasChunks(
  database: Sequelize,
  runId: string,
  transaction: Transaction,
): Promise<boolean> {
  const found = await database.query('select 1 from run_chunks where run_id = $1 limit 1', {
    type: QueryTypes.SELECT,
    bind: [runId],
    transaction,
  });
  return found.length > 0;
}

/** Marks a part as done; false where it was already, by whoever also took it. */
export async function closeChunk(
  database: Sequelize,
  { runId, chunk }: { readonly runId: string; readonly chunk: number },
  transaction: Transaction,
): Promise<boolean> {
  const closed = await database.query(
    `update run_chunks set done_at = now()
     where run_id = $1 and chunk = $2 and done_at is null returning chunk`,
    { type: QueryTypes.SELECT, bind: [runId, chunk], transaction },
  );
  return closed.length > 0;
}

/** How far a run is; of a run that does not exist, undefined. */
export async function findProgress(
  database: Sequelize,
  runId: string,
): Promise<RunProgress | undefined> {
  const [row] = await database.query<RunProgress>(
    `select s.state, s.fault, r.buildings, coalesce((
       select sum(cardinality(c.members)) from run_chunks c
       where c.run_id = r.id and c.done_at is not null
     ), 0)::integer as done
     from runs r join run_states s on s.run_id = r.id where r.id = $1`,
    { type: QueryTypes.SELECT, bind: [runId] },
  );
  return row;
}
