import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { EvidenceLayout, PrintAnswer } from '../../shared/schemas/evidence.ts';

/** A print with who asked for it and of which run, as its presenter wants it. */
export type FoundPrint = Omit<PrintAnswer, 'askedAt'> & {
  readonly schemeId: string;
  readonly askedAt: Date;
};

const MOST = 100;

const PRINTS = `
  select p.id, p.scheme_id as "schemeId", p.number, p.name, p.layout, p.run_id as "runId",
    r.number as "runNumber", p.state, p.done, p.sheets, p.fault, p.bytes, p.fingerprint,
    p.asked_at as "askedAt", a.name as "askedBy"
  from prints p join runs r on r.id = p.run_id left join people a on a.id = p.asked_by`;

/** The newest prints of a scheme, the newest first, or one of them. */
export function findPrints(
  database: Sequelize,
  schemeId: string,
  printId: string | null = null,
): Promise<FoundPrint[]> {
  return database.query<FoundPrint>(
    `${PRINTS} where p.scheme_id = $1 and ($2::uuid is null or p.id = $2)
     order by p.number desc limit ${MOST}`,
    { type: QueryTypes.SELECT, bind: [schemeId, printId] },
  );
}

/** How many prints of a scheme are not drawn yet. */
export async function countWaitingPrints(
  database: Sequelize,
  schemeId: string,
  transaction: Transaction,
): Promise<number> {
  const [row] = await database.query<{ count: number }>(
    `select count(*)::integer as count from prints
     where scheme_id = $1 and state in ('waiting', 'printing')`,
    { type: QueryTypes.SELECT, bind: [schemeId], transaction },
  );
  return row?.count ?? 0;
}

/** Which of some prints are done. */
export async function printsThatAreDone(
  database: Sequelize,
  ids: readonly string[],
): Promise<string[]> {
  const rows = await database.query<{ id: string }>(
    `select id from prints where id = any($1::uuid[]) and state = 'done'`,
    { type: QueryTypes.SELECT, bind: [ids] },
  );
  return rows.map(({ id }) => id);
}

/** Keeps what was asked for, with the next number of the scheme. */
export async function insertPrint(
  database: Sequelize,
  print: {
    readonly id: string;
    readonly schemeId: string;
    readonly runId: string;
    readonly name: string;
    readonly layout: EvidenceLayout;
    readonly by: string | null;
  },
  transaction: Transaction,
): Promise<void> {
  const { id, schemeId, runId, name, layout, by } = print;
  await database.query(
    `insert into prints (id, scheme_id, run_id, number, name, layout, asked_by)
     select $1, $2, $3, coalesce(max(number), 0) + 1, $4, $5::jsonb, $6
     from prints where scheme_id = $2`,
    { bind: [id, schemeId, runId, name, JSON.stringify(layout), by], transaction },
  );
}

async function moved(
  database: Sequelize,
  statement: string,
  bind: unknown[],
  transaction: Transaction | null = null,
): Promise<boolean> {
  const rows = await database.query(`${statement} returning id`, {
    ...{ type: QueryTypes.SELECT as const, bind, transaction },
  });
  return rows.length > 0;
}

/** Takes a print in hand; undefined where it does not wait. */
export async function beginPrint(database: Sequelize, id: string): Promise<FoundPrint | undefined> {
  const begun = `update prints set state = 'printing', done = 0 where id = $1 and state = 'waiting'`;
  if (!(await moved(database, begun, [id]))) return undefined;
  const [print] = await database.query<FoundPrint>(`${PRINTS} where p.id = $1`, {
    type: QueryTypes.SELECT,
    bind: [id],
  });
  return print;
}

/** Writes down how far a print is. */
export async function writePrintProgress(
  database: Sequelize,
  id: string,
  { done, sheets }: { readonly done: number; readonly sheets: number },
): Promise<void> {
  await database.query(
    `update prints set done = $2, sheets = $3 where id = $1 and state = 'printing'`,
    { bind: [id, done, sheets] },
  );
}

/** Writes down that a print is whole; false where it was stopped meanwhile. */
export function finishPrint(
  database: Sequelize,
  id: string,
  {
    sheets,
    bytes,
    fingerprint,
  }: {
    readonly sheets: number;
    readonly bytes: number;
    readonly fingerprint: string;
  },
  transaction: Transaction,
): Promise<boolean> {
  return moved(
    database,
    `update prints set state = 'done', done = $2, sheets = $2, bytes = $3, fingerprint = $4
     where id = $1 and state = 'printing'`,
    [id, sheets, bytes, fingerprint],
    transaction,
  );
}

/** Writes down why a print failed. */
export async function failPrint(database: Sequelize, id: string, fault: string): Promise<void> {
  await database.query(
    `update prints set state = 'failed', fault = $2
     where id = $1 and state in ('waiting', 'printing')`,
    { bind: [id, fault] },
  );
}

/** Stops a print for good; false where it has ended already. */
export function stopPrint(
  database: Sequelize,
  id: string,
  transaction: Transaction,
): Promise<boolean> {
  return moved(
    database,
    `update prints set state = 'cancelled' where id = $1 and state in ('waiting', 'printing')`,
    [id],
    transaction,
  );
}

/** Puts back what was being printed, and tells what waits, the oldest first. */
export async function putPrintsBack(
  database: Sequelize,
): Promise<{ readonly id: string; readonly schemeId: string }[]> {
  await database.query(`update prints set state = 'waiting', done = 0 where state = 'printing'`);
  return database.query(
    `select id, scheme_id as "schemeId" from prints where state = 'waiting' order by asked_at, number`,
    { type: QueryTypes.SELECT },
  );
}
