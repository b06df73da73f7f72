import { AppError } from '../errors.ts';
import { RegisterImport } from '../models/register-import.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';

function refuseUnready({ missing, counts }: RegisterImport): void {
  if (missing.length > 0 || counts === null) {
    const message = missing.includes('settle')
      ? 'Some values changed both here and in the file. Say first which are kept.'
      : 'Say first what is missing.';
    throw new AppError('invalid-input', message, [{ path: 'missing', message }]);
  }
  if (counts.new + counts.changed + counts.conflict > 0) return;
  const message = 'There is nothing to take over.';
  throw new AppError('invalid-input', message, [{ path: 'counts', message }]);
}

/** Confirms an import as it was seen: it is taken over beside requests, all of it or nothing. */
export async function confirmImport(
  { jobs }: Services,
  actor: Actor,
  row: RegisterImport,
  version: number,
): Promise<void> {
  if (row.version !== version || row.state !== 'asking') throw new AppError('conflict');
  refuseUnready(row);
  const [confirmed] = await RegisterImport.update(
    { state: 'importing', fault: null, done: 0 },
    { where: { id: row.id, version, state: 'asking' } },
  );
  if (confirmed !== 1) throw new AppError('conflict');
  const { id: importId, schemeId } = row;
  jobs.start({ kind: 'take over', importId, schemeId, personId: actor.id });
  await row.reload();
}
