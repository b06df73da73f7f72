import { mkdir, rename, rm, stat } from 'node:fs/promises';
import path from 'node:path';
import { recordChange } from '../commands/record-change.ts';
import { AppError } from '../errors.ts';
import { fingerprintOf, unfinishedFile } from '../evidence/print-file.ts';
import { PRINTERS } from '../evidence/printers.ts';
import { beginPrint, finishPrint, writePrintProgress, type FoundPrint } from '../models/prints.ts';
import { Scheme } from '../models/scheme.ts';
import type { JobTools, PrintJob } from './job.ts';

/** Draws a print into a file that is not whole yet; how many sheets it has. */
async function draw(tools: JobTools, print: FoundPrint, file: string): Promise<number> {
  const { database, signal } = tools;
  const scheme = await Scheme.findByPk(print.schemeId, { rejectOnEmpty: true });
  await mkdir(path.dirname(file), { recursive: true, mode: 0o700 });
  await rm(file, { force: true });
  return PRINTERS[print.layout.kind]({
    database,
    scheme,
    print,
    file,
    onSheet: async (done, sheets) => {
      signal.throwIfAborted();
      await writePrintProgress(database, print.id, { done, sheets });
    },
  });
}

async function finish(
  { database }: JobTools,
  { id, schemeId, number }: FoundPrint,
  found: { readonly sheets: number; readonly bytes: number; readonly fingerprint: string },
): Promise<void> {
  await database.transaction(async (transaction) => {
    if (!(await finishPrint(database, id, found, transaction))) throw new AppError('conflict');
    const subject = { kind: 'print', id };
    const change = { by: null, schemeId, action: 'finish print', subject };
    await recordChange({ ...change, after: { number, ...found } }, transaction);
  });
}

/** Prints what was asked for: sheet by sheet into a file beside its place, which it takes once it is whole. */
export async function printSheets(tools: JobTools, { printId, file }: PrintJob): Promise<void> {
  const print = await beginPrint(tools.database, printId);
  if (print === undefined) return;
  const unfinished = unfinishedFile(file);
  const sheets = await draw(tools, print, unfinished);
  tools.signal.throwIfAborted();
  const [{ size: bytes }, fingerprint] = await Promise.all([
    stat(unfinished),
    fingerprintOf(unfinished),
  ]);
  await rename(unfinished, file);
  await finish(tools, print, { sheets, bytes, fingerprint });
}
