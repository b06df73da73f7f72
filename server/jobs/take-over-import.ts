import type { Sequelize } from 'sequelize';
import { changeRegister } from '../commands/change-register.ts';
import { AppError } from '../errors.ts';
import { findTakenRows, type TakenRow } from '../models/checked-rows.ts';
import { RegisterImport } from '../models/register-import.ts';
import { rowRanges } from '../models/row-ranges.ts';
import { Scheme } from '../models/scheme.ts';
import { deleteStagedRows } from '../models/staged-rows.ts';
import type { ChangedBuilding, CreatedBuilding } from '../register/register-edits.ts';
import type { ImportJob, JobTools } from './job.ts';
import { createProgress } from './progress.ts';
import { removeKeptFile } from './remove-file.ts';

const AT_ONCE = 2000;

type Walk = {
  readonly database: Sequelize;
  readonly signal: AbortSignal;
  readonly importId: string;
  readonly onRow: () => Promise<void>;
};

/** The rows to take over one after the other, read beside the transaction that writes them. */
async function* takenRows(walk: Walk, isNew: boolean): AsyncGenerator<TakenRow> {
  const { database, signal, importId, onRow } = walk;
  for await (const range of rowRanges(database, importId, AT_ONCE)) {
    signal.throwIfAborted();
    for (const row of await findTakenRows(database, importId, range, isNew)) {
      await onRow();
      yield row;
    }
  }
}

async function* created(walk: Walk): AsyncGenerator<CreatedBuilding> {
  for await (const { reference, footprint, taking } of takenRows(walk, true)) {
    if (footprint === null) continue;
    const { attributes, imported } = taking;
    yield { reference, footprint, attributes, imported };
  }
}

async function* changed(walk: Walk): AsyncGenerator<ChangedBuilding> {
  for await (const { buildingId, footprint, taking } of takenRows(walk, false)) {
    const { version, attributes, imported } = taking;
    if (buildingId === null || version === null) continue;
    const drawn = footprint === null ? {} : { footprint };
    yield { id: buildingId, version, attributes, imported, ...drawn };
  }
}

function walkOf({ database, signal }: JobTools, importId: string): Walk {
  const progress = createProgress(importId);
  let done = 0;
  const onRow = async () => {
    done += 1;
    if (done % 500 === 0) await progress(done);
  };
  return { database, signal, importId, onRow };
}

/** Takes a checked import over into the register, in one transaction with its own end. */
export async function takeOverImport(
  tools: JobTools,
  { importId, personId }: Extract<ImportJob, { kind: 'take over' }>,
): Promise<void> {
  const { database, signal } = tools;
  const row = await RegisterImport.findByPk(importId);
  const scheme = row && (await Scheme.findByPk(row.schemeId));
  if (row?.state !== 'importing' || !scheme) return;
  const walk = walkOf(tools, importId);
  const cause = { kind: 'import', by: { id: personId }, source: row.fileName, importId } as const;
  await database.transaction(async (transaction) => {
    const edits = { created: created(walk), changed: changed(walk) };
    const { changeId } = await changeRegister(database, scheme, cause, edits, transaction);
    signal.throwIfAborted();
    const where = { id: importId, state: 'importing' } as const;
    const [ended] = await RegisterImport.update({ state: 'done', changeId, fault: null }, { where, transaction }); // prettier-ignore
    if (ended !== 1) throw new AppError('conflict');
  });
  await removeKeptFile(row);
  await deleteStagedRows(database, importId, { keepNoted: true });
}
