import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import type { z } from 'zod';
import { plannedSheets } from '../../shared/evidence/planned-sheets.ts';
import type { EvidenceLayout, newPrintSchema } from '../../shared/schemas/evidence.ts';
import { AppError } from '../errors.ts';
import { printFile } from '../evidence/print-file.ts';
import { countWaitingPrints, insertPrint } from '../models/prints.ts';
import { Run } from '../models/run.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { findCompleteRun } from '../runs/find-complete-run.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';
import { refusingBadValues } from './refuse-bad-design.ts';

/** Refuses a layout that makes no sheets of the run's line. */
async function refuseBadLayout(layout: EvidenceLayout, runId: string): Promise<void> {
  if (layout.kind === 'schedule') return;
  const { design } = await Run.findByPk(runId, { rejectOnEmpty: true });
  refusingBadValues('layout', () => plannedSheets(layout, design));
}

/** So many prints of a scheme wait at the most: each keeps the machine busy for a while. */
const MOST_WAITING = 10;

async function refuseMany(
  database: Services['database'],
  schemeId: string,
  transaction: Transaction,
): Promise<void> {
  if ((await countWaitingPrints(database, schemeId, transaction)) < MOST_WAITING) return;
  const message = `${MOST_WAITING} prints of this scheme are waiting already. Wait until one of them is done, or cancel one.`;
  throw new AppError('conflict', message);
}

/** Asks for a print of a complete run: it is drawn beside requests. */
export async function askPrint(
  { database, env, jobs }: Pick<Services, 'database' | 'env' | 'jobs'>,
  by: Pick<Actor, 'id'> | null,
  scheme: Scheme,
  { runId, name, layout }: z.infer<typeof newPrintSchema> & { readonly runId: string },
): Promise<string> {
  const { id: schemeId } = scheme;
  const { number } = await findCompleteRun(database, schemeId, runId);
  await refuseBadLayout(layout, runId);
  const id = randomUUID();
  await database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    await refuseMany(database, schemeId, transaction);
    await insertPrint(
      database,
      { id, schemeId, runId, name, layout, by: by?.id ?? null },
      transaction,
    );
    const subject = { kind: 'print', id };
    const change = { by, schemeId, action: 'ask for print', subject };
    await recordChange({ ...change, after: { name, run: number, layout } }, transaction);
  });
  jobs.start({ kind: 'print', printId: id, schemeId, file: printFile(env, id) });
  return id;
}
