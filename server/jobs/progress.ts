import { RegisterImport } from '../models/register-import.ts';

/** How often the progress of a job is written down, in milliseconds: as often as clients ask. */
const EVERY = 400;

/** Writes down how far a job is, not more often than anybody looks. */
export function createProgress(importId: string) {
  let last = 0;
  return async (done: number): Promise<void> => {
    const now = Date.now();
    if (now - last < EVERY) return;
    last = now;
    await RegisterImport.update({ done }, { where: { id: importId } });
  };
}
