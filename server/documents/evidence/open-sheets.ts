import type { Measure } from '../../../shared/evidence/marks.ts';
import type { Sheet } from '../../../shared/evidence/sheet.ts';
import { POINTS_PER_MM } from '../pdf/page-sizes.ts';
import { openPaperFile } from '../pdf/paper-file.ts';
import type { PaperFacts } from '../pdf/paper.ts';
import { drawMarks } from './draw-marks.ts';
import { openMeasure } from './measure.ts';

/** A document that grows sheet by sheet. */
export type OpenSheets = {
  readonly measure: Measure;
  readonly add: (sheet: Sheet) => Promise<void>;
  /** Ends the document once all of it is on the disk; how many sheets it has. */
  readonly close: () => Promise<number>;
  /** Leaves what there is; resolves when the file is closed and may be removed. */
  readonly giveUp: () => Promise<void>;
};

/** Opens a document of sheets in a new file; each sheet leaves memory when the next one comes. */
export function openSheets(file: string, facts: PaperFacts): OpenSheets {
  const { paper, settle, close, giveUp } = openPaperFile(file, facts);
  const { doc } = paper;
  let count = 0;
  return {
    giveUp,
    measure: openMeasure(paper),
    add: async ({ name, width, height, marks }) => {
      const [across, down] = [width * POINTS_PER_MM, height * POINTS_PER_MM];
      doc.addPage({ size: [across, down], margin: 0 });
      doc.outline.addItem(name);
      drawMarks(paper, { left: 0, top: 0, right: width, bottom: height }, marks);
      count += 1;
      await settle();
    },
    close: async () => {
      await close();
      return count;
    },
  };
}
