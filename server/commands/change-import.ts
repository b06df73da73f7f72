import type { ImportOptions } from '../../shared/schemas/imports.ts';
import { AppError, type FieldFault } from '../errors.ts';
import { placementOf } from '../imports/placement.ts';
import { RegisterImport } from '../models/register-import.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Services } from '../services.ts';

/** Columns that the file does not have. */
function columnFaults({ columns }: RegisterImport, options: ImportOptions): FieldFault[] {
  const names = new Set(columns.map(({ name }) => name));
  return Object.entries(options.columns)
    .filter(([, column]) => !names.has(column))
    .map(([field]) => ({
      path: `options.columns.${field}`,
      message: 'The file has no such column.',
    }));
}

async function refuseWrong(row: RegisterImport, scheme: Scheme, options: ImportOptions) {
  const faults = columnFaults(row, options);
  if (faults.length > 0) throw new AppError('invalid-input', undefined, faults);
  const { crs } = options.place;
  if (crs !== null) await placementOf({ ...options.place, crs }, scheme.crs);
}

/** Chooses anew for an import, which is checked again; a check of what was chosen before stops. */
export async function changeImport(
  { jobs }: Services,
  scheme: Scheme,
  row: RegisterImport,
  { version, options }: { readonly version: number; readonly options: ImportOptions },
): Promise<void> {
  await refuseWrong(row, scheme, options);
  const [changed] = await RegisterImport.update(
    { options, version: version + 1, state: 'checking', fault: null, done: 0 },
    { where: { id: row.id, version, state: ['asking', 'checking'] } },
  );
  if (changed !== 1) throw new AppError('conflict');
  await jobs.stop(row.id);
  jobs.start({ kind: 'check', importId: row.id, schemeId: scheme.id });
  await row.reload();
}
