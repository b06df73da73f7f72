import { boxOfSheet } from '../../shared/evidence/box-of-sheet.ts';
import { drawnSheets } from '../../shared/evidence/drawn-sheets.ts';
import { lineOnGround } from '../../shared/evidence/line-on-ground.ts';
import { plannedSheets } from '../../shared/evidence/planned-sheets.ts';
import { openSheets } from '../documents/evidence/open-sheets.ts';
import { AppError } from '../errors.ts';
import { aboutPrint, factsOfPrint } from './about-print.ts';
import { openMaterial } from './open-material.ts';
import type { Printing } from './printing.ts';

/** Draws plans and sections sheet by sheet, with what each of them needs at hand and no more. */
export async function printDrawn(printing: Printing): Promise<number> {
  const { database, scheme, print, file, onSheet } = printing;
  const { layout } = print;
  if (layout.kind === 'schedule') throw new AppError('internal');
  const about = await aboutPrint(printing);
  const { design } = about.run;
  const [all, line] = [plannedSheets(layout, design), lineOnGround(design.line)];
  const materialIn = await openMaterial(database, scheme, about.run);
  const sheets = openSheets(file, factsOfPrint(printing, about));
  try {
    for (const [done, planned] of all.entries()) {
      await onSheet(done, all.length);
      const material = await materialIn(boxOfSheet(planned, line));
      for (const sheet of drawnSheets(planned, all, material, about, sheets.measure)) {
        await sheets.add(sheet);
      }
    }
    await onSheet(all.length, all.length);
    return await sheets.close();
  } catch (error) {
    await sheets.giveUp();
    throw error;
  }
}
