import { createHash, randomUUID } from 'node:crypto';
import { constants } from 'node:fs';
import { access, mkdir, open, rename, rm } from 'node:fs/promises';
import path from 'node:path';

/** Where in the folder a photograph is, by what it holds. */
export function placeOfPhotograph(sha256: string): string {
  return path.join(sha256.slice(0, 2), sha256);
}

async function isThere(file: string): Promise<boolean> {
  try {
    await access(file, constants.R_OK);
    return true;
  } catch {
    return false;
  }
}

/** Writes a file that is whole or not there, also when the machine dies. */
async function writeWhole(file: string, bytes: Buffer): Promise<void> {
  const unfinished = `${file}.${randomUUID()}.unfinished`;
  try {
    const handle = await open(unfinished, 'wx', 0o600);
    try {
      await handle.writeFile(bytes);
      await handle.sync();
    } finally {
      await handle.close();
    }
    await rename(unfinished, file);
  } catch (error) {
    await rm(unfinished, { force: true });
    throw error;
  }
}

/** Keeps the bytes of a photograph in the folder, once however often they come; gives their hash. */
export async function keepInFolder(folder: string, bytes: Buffer): Promise<string> {
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  const file = path.join(folder, placeOfPhotograph(sha256));
  if (await isThere(file)) return sha256;
  await mkdir(path.dirname(file), { recursive: true, mode: 0o700 });
  await writeWhole(file, bytes);
  return sha256;
}

/** Removes a photograph from the folder; one that is not there is no fault. */
export async function removeFromFolder(folder: string, sha256: string): Promise<void> {
  await rm(path.join(folder, placeOfPhotograph(sha256)), { force: true });
}
