import type { AboutSheets } from '../../shared/evidence/sheet.ts';
import type { PaperFacts } from '../documents/pdf/paper.ts';
import { aboutRun } from './about-run.ts';
import type { Printing } from './printing.ts';

/** What every sheet of a print says of itself. */
export async function aboutPrint({ database, scheme, print }: Printing): Promise<AboutSheets> {
  return {
    ...(await aboutRun({ database }, scheme, print.runId)),
    fields: print.layout.fields,
  };
}

/** What the document of a print says of itself. */
export function factsOfPrint(
  { scheme, print }: Printing,
  { fields, run }: AboutSheets,
): PaperFacts {
  return {
    title: fields.title === '' ? print.name : fields.title,
    author: scheme.name,
    subject: `Print ${print.number} of run ${run.number}, ${run.option.name}`,
    at: print.askedAt,
  };
}
