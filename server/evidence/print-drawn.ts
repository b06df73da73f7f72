import { boxOfSheet } from '../../shared/evidence/box-of-sheet.ts';
import { drawnSheets } from '../../shared/evidence/drawn-sheets.ts';
import { lineOnGround } from '../../shared/evidence/line-on-ground.ts';
import { plannedSheets } from '../../shared/evidence/planned-sheets.ts';
import type { AboutSheets } from '../../shared/evidence/sheet.ts';
import { openSheets } from '../documents/evidence/open-sheets.ts';
import { AppError } from '../errors.ts';
import { aboutRun } from './about-run.ts';
import { openMaterial } from './open-material.ts';
import type { Printing } from './printing.ts';

async function aboutPrint({ database, scheme, print }: Printing): Promise<AboutSheets> {
  return {
    ...(await aboutRun({ database }, scheme, print.runId)),
    fields: print.layout.fields,
  };
}

function factsOf({ scheme, print }: Printing, { fields, run }: AboutSheets) {
  return {
    title: fields.title === '' ? print.name : fields.title,
    author: scheme.name,
    subject: `Print ${print.number} of run ${run.number}, ${run.option.name}`,
    at: print.askedAt,
  };
}

/** Draws plans and sections sheet by sheet, with what each of them needs at hand and no more. */
export async function printDrawn(printing: Printing): Promise<number> {
  const { database, scheme, print, file, onSheet } = printing;
  const { layout } = print;
  if (layout.kind === 'schedule') throw new AppError('internal');
  const about = await aboutPrint(printing);
  const { design } = about.run;
  const [all, line] = [plannedSheets(layout, design), lineOnGround(design.line)];
  const materialIn = await openMaterial(database, scheme, about.run);
  const sheets = openSheets(file, factsOf(printing, about));
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
