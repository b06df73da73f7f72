import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { AppError } from '../../server/errors.ts';
import { openUpload } from '../../server/importers/open-upload.ts';
import { HOSTILE_FILES } from './hostile/hostile-files.ts';

const SLOWEST_SHOWN = 3;

type Timed = { readonly name: string; readonly seconds: number };

/** Seconds until a file is refused; one that is taken, or fails in another way, ends the run. */
async function refusalTime(file: string, name: string): Promise<Timed> {
  const start = performance.now();
  try {
    await openUpload(file);
  } catch (error) {
    if (error instanceof AppError) return { name, seconds: (performance.now() - start) / 1000 };
    throw error;
  }
  throw new Error(`${name} was taken`);
}

/** Lines about how long it takes to refuse files that are broken or hostile: all, and the slowest. */
export async function hostileTimes(): Promise<string[]> {
  const folder = mkdtempSync(path.join(tmpdir(), 'groundsill-hostile-'));
  try {
    const times: Timed[] = [];
    for (const { name, make } of HOSTILE_FILES) {
      const file = path.join(folder, 'upload');
      writeFileSync(file, await make());
      times.push(await refusalTime(file, name));
    }
    const slowest = times.sort((a, b) => b.seconds - a.seconds).slice(0, SLOWEST_SHOWN);
    return [
      `hostile files: ${times.length} refused, the slowest in ${(slowest[0]?.seconds ?? 0).toFixed(2)} s`,
      ...slowest.map(({ name, seconds }) => `  ${name}: ${seconds.toFixed(2)} s`),
    ];
  } finally {
    rmSync(folder, { recursive: true });
  }
}
