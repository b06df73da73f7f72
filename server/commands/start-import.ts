import { NO_OPTIONS } from '../imports/first-options.ts';
import { RegisterImport } from '../models/register-import.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { recordChange } from './record-change.ts';

/** Takes a file that was sent in hand: it is read beside requests. */
export async function startImport(
  { database, jobs }: Services,
  actor: Actor,
  scheme: Scheme,
  { file, fileName }: { readonly file: string; readonly fileName: string },
): Promise<RegisterImport> {
  const { id: schemeId } = scheme;
  const row = await database.transaction(async (transaction) => {
    const begun = { schemeId, personId: actor.id, state: 'reading', fileName } as const;
    const made = await RegisterImport.create({ ...begun, options: NO_OPTIONS }, { transaction });
    const subject = { kind: 'import', id: made.id };
    const after = { fileName };
    await recordChange(
      { by: actor, schemeId, action: 'start import', subject, after },
      transaction,
    );
    return made;
  });
  jobs.start({ kind: 'read', importId: row.id, schemeId, file });
  return row;
}
