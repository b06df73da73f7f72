import { IMPORT_LIMITS } from '../../shared/schemas/imports.ts';
import { AppError } from '../errors.ts';
import { openUpload } from '../importers/open-upload.ts';
import type { Upload } from '../importers/upload.ts';
import { createColumnCollector } from '../imports/column-collector.ts';
import { firstOptions } from '../imports/first-options.ts';
import { createPointSample } from '../imports/point-sample.ts';
import { RegisterImport } from '../models/register-import.ts';
import { insertStagedRows } from '../models/staged-rows.ts';
import { ahead } from '../register/ahead.ts';
import { inBatches } from '../register/in-batches.ts';
import type { ImportJob, JobTools } from './job.ts';
import { createProgress } from './progress.ts';
import { removeReadFile } from './remove-file.ts';

const AT_ONCE = 1000;

type Reading = {
  readonly count: number;
  readonly columns: ReturnType<ReturnType<typeof createColumnCollector>['columns']>;
  readonly points: readonly (readonly [number, number])[];
};

function tooLong(): AppError {
  const most = IMPORT_LIMITS.rows.toLocaleString('en-GB');
  return new AppError('too-large', `The file has more than ${most} rows. Send it in parts.`);
}

/** Brings the rows of a file into the database, and gives what can be said of all of them. */
async function stageRows(
  { database, signal }: JobTools,
  importId: string,
  upload: Upload,
): Promise<Reading> {
  const [collector, sample] = [createColumnCollector(upload.columns), createPointSample()];
  const progress = createProgress(importId);
  let count = 0;
  for await (const batch of ahead(inBatches(upload.rows(), AT_ONCE))) {
    count += batch.length;
    if (count > IMPORT_LIMITS.rows) throw tooLong();
    for (const { properties, geometry } of batch) {
      collector.add(properties);
      const corner = geometry?.[0]?.[0]?.[0];
      if (corner !== undefined) sample.add(corner);
    }
    signal.throwIfAborted();
    await insertStagedRows(database, importId, batch);
    await progress(count);
  }
  return { count, columns: collector.columns(), points: sample.points() };
}

async function stage(
  tools: JobTools,
  { importId, schemeId, file, layer: wanted }: Extract<ImportJob, { kind: 'read' }>,
): Promise<void> {
  const upload = await openUpload(file, wanted);
  const { format, kind, layer } = upload;
  const layers = { layers: [...upload.layers], file: upload.layers.length > 1 ? file : null };
  if (upload.count > IMPORT_LIMITS.rows) throw tooLong();
  const where = { id: importId, state: 'reading' } as const;
  await RegisterImport.update({ format, kind, layer, ...layers, of: upload.count }, { where });
  const reading = await stageRows(tools, importId, upload);
  const first = await firstOptions(tools.database, schemeId, upload, reading);
  const { columns, count } = reading;
  await RegisterImport.update({ columns, ...first, done: 0, of: count, state: 'checking' }, { where }); // prettier-ignore
}

/** Reads a file that was sent into rows that can be checked; it goes unless another layer may be wanted. */
export async function readImport(
  tools: JobTools,
  job: Extract<ImportJob, { kind: 'read' }>,
): Promise<void> {
  try {
    await stage(tools, job);
  } finally {
    await removeReadFile(job);
  }
}
