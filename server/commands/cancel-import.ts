import { AppError } from '../errors.ts';
import { removeKeptFile } from '../jobs/remove-file.ts';
import { RegisterImport } from '../models/register-import.ts';
import { deleteStagedRows } from '../models/staged-rows.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { recordChange } from './record-change.ts';

const CANCELLED = ['reading', 'checking', 'asking', 'importing', 'failed'];

/** Drops an import, whatever is being done of it: nothing of it stays in the register. */
export async function cancelImport(
  { database, jobs }: Services,
  actor: Actor,
  row: RegisterImport,
): Promise<void> {
  await jobs.stop(row.id);
  const { id, schemeId } = row;
  await database.transaction(async (transaction) => {
    const where = { id, state: CANCELLED };
    const [cancelled] = await RegisterImport.update({ state: 'cancelled' }, { where, transaction });
    if (cancelled !== 1) {
      const message = 'It was taken over or dropped already. To take it back, undo the change.';
      throw new AppError('conflict', message);
    }
    const subject = { kind: 'import', id };
    const told = { before: { state: row.state }, after: { state: 'cancelled' } };
    await recordChange(
      { by: actor, schemeId, action: 'cancel import', subject, ...told },
      transaction,
    );
  });
  await row.reload();
  await removeKeptFile(row);
  await deleteStagedRows(database, id, { keepNoted: false });
}
