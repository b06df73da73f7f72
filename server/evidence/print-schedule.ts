import { Transaction } from 'sequelize';
import { openPaperFile, type PaperFile } from '../documents/pdf/paper-file.ts';
import { beginSchedule } from '../documents/schedule/begin-schedule.ts';
import type { ScheduleAbout } from '../documents/schedule/schedule-page.ts';
import { AppError } from '../errors.ts';
import { findRunOrder, findRunRows, type RunRow } from '../models/find-run-rows.ts';
import { packedIds } from '../register/packed-ids.ts';
import { aboutPrint, factsOfPrint } from './about-print.ts';
import type { Printing } from './printing.ts';

/** So many rows are read and drawn at once; a few pages. */
const AT_ONCE = 200;

type Rows = AsyncIterable<readonly RunRow[]>;

async function aboutSchedule(printing: Printing): Promise<ScheduleAbout> {
  const { layout, askedAt } = printing.print;
  if (layout.kind !== 'schedule') throw new AppError('internal');
  const { paper, rows } = layout;
  return { ...(await aboutPrint(printing)), paper, rows, askedAt };
}

/** The rows in order, piece by piece, as often as they are asked for. */
async function piecesOf(
  { database, print: { runId } }: Printing,
  { rows }: ScheduleAbout,
  transaction: Transaction,
): Promise<() => Rows> {
  const order = packedIds(await findRunOrder(database, runId, rows));
  return async function* inPieces() {
    for (let from = 0; from < order.count; from += AT_ONCE) {
      const ids = order.slice(from, from + AT_ONCE);
      yield await findRunRows(database, { runId, ids, isDrawn: false }, transaction);
    }
  };
}

async function countPages({ paper }: PaperFile, about: ScheduleAbout, rows: Rows): Promise<number> {
  const counting = beginSchedule(paper, about, null);
  for await (const piece of rows) piece.forEach(counting.put);
  return counting.end();
}

async function drawPages(
  { paper, settle }: PaperFile,
  about: ScheduleAbout,
  rows: Rows,
  told: { readonly count: number; readonly onSheet: Printing['onSheet'] },
): Promise<void> {
  const { count, onSheet } = told;
  const schedule = beginSchedule(paper, about, count);
  for await (const piece of rows) {
    await onSheet(schedule.pages(), count);
    piece.forEach(schedule.put);
    await settle();
  }
  schedule.end();
  await onSheet(count, count);
}

/** Draws a table of buildings: once to count its pages, which each of them tells, and once into the file. */
export async function printSchedule(printing: Printing): Promise<number> {
  const { database, file, onSheet } = printing;
  const about = await aboutSchedule(printing);
  const open = openPaperFile(file, factsOfPrint(printing, about));
  try {
    // what is decided may change meanwhile: both times the same is read
    const isolationLevel = Transaction.ISOLATION_LEVELS.REPEATABLE_READ;
    const count = await database.transaction({ isolationLevel }, async (transaction) => {
      const pieces = await piecesOf(printing, about, transaction);
      const pages = await countPages(open, about, pieces());
      await drawPages(open, about, pieces(), { count: pages, onSheet });
      return pages;
    });
    await open.close();
    return count;
  } catch (error) {
    await open.giveUp();
    throw error;
  }
}
