import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { openUpload } from '../../server/importers/open-upload.ts';
import type { Upload, UploadRow } from '../../server/importers/upload.ts';

/** Opens bytes as an uploaded file. */
export async function uploadOf(bytes: Buffer | string): Promise<Upload> {
  const folder = await mkdtemp(path.join(tmpdir(), 'groundsill-upload-'));
  try {
    const file = path.join(folder, 'upload');
    await writeFile(file, bytes);
    return await openUpload(file);
  } finally {
    await rm(folder, { recursive: true });
  }
}

export async function rowsOf(bytes: Buffer | string): Promise<UploadRow[]> {
  const rows: UploadRow[] = [];
  for await (const row of (await uploadOf(bytes)).rows()) rows.push(row);
  return rows;
}

/** What the refusal of a file says, and its code. */
export async function refusalOf(bytes: Buffer | string): Promise<string> {
  const error: unknown = await uploadOf(bytes).then(
    () => new Error('It was taken.'),
    (reason: unknown) => reason,
  );
  if (!(error instanceof Error)) return 'It was refused without a reason.';
  return 'code' in error ? `${String(error.code)}: ${error.message}` : String(error.stack);
}
