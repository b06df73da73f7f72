import type { ColumnPen } from '../../../shared/evidence/column-part.ts';
import { boxMark, type Rectangle } from '../../../shared/evidence/marks.ts';
import { sheetLayout } from '../../../shared/evidence/paper-sizes.ts';
import type { AboutSheets } from '../../../shared/evidence/sheet.ts';
import { titleStrip } from '../../../shared/evidence/title-part.ts';
import type { EvidenceLayout } from '../../../shared/schemas/evidence.ts';
import { drawMarks } from '../evidence/draw-marks.ts';
import { openMeasure } from '../evidence/measure.ts';
import { POINTS_PER_MM } from '../pdf/page-sizes.ts';
import type { Paper } from '../pdf/paper.ts';

/** What a schedule says of itself. */
export type ScheduleAbout = AboutSheets &
  Pick<Extract<EvidenceLayout, { kind: 'schedule' }>, 'paper' | 'rows'> & {
    readonly askedAt: Date;
  };

/** The pages of a schedule: where its table stands on them, and what stands round it. */
export type SchedulePage = {
  readonly pen: ColumnPen;
  /** All of the paper, in mm. */
  readonly seen: Rectangle;
  /** Where the table may stand, in points. */
  readonly area: { readonly left: number; readonly top: number; readonly bottom: number };
  readonly width: number;
  readonly draw: (number: number, count: number) => void;
};

/** From the frame to the table, in mm. */
const PAD = 3;

function stripOf(pen: ColumnPen, { scheme, run, fields, paper }: ScheduleAbout, sheet: string) {
  const { title, subtitle, number, revisions, prepared, checked, approved, issued } = fields;
  return titleStrip(pen, {
    ...{
      owner: scheme.name,
      title,
      subtitle,
      number,
      sheet,
      paper,
      scale: '',
      kind: 'Schedule',
      list: '',
    },
    revision: revisions[0]?.revision ?? '',
    ...{ prepared, checked, approved, issued, run: String(run.number) },
  });
}

/** How the pages of a schedule are laid out: lying, with the title block at the foot and room for a stamp. */
export function schedulePage(paper: Paper, about: ScheduleAbout): SchedulePage {
  const { width, height, frame, scale } = sheetLayout(about.paper);
  const measure = openMeasure(paper);
  const wide = { width: frame.right - frame.left, scale, measure };
  const seen = { left: 0, top: 0, right: width, bottom: height };
  const stripTop = frame.bottom - stripOf(wide, about, '').height;
  const inner = wide.width - 2 * PAD;
  return {
    ...{ pen: { ...wide, width: inner }, seen, width: inner * POINTS_PER_MM },
    area: {
      left: (frame.left + PAD) * POINTS_PER_MM,
      top: (frame.top + PAD) * POINTS_PER_MM,
      bottom: (stripTop - PAD) * POINTS_PER_MM,
    },
    draw: (number, count) => {
      paper.doc.addPage({ size: [width * POINTS_PER_MM, height * POINTS_PER_MM], margin: 0 });
      const strip = stripOf(wide, about, `${number} of ${count}`);
      drawMarks(paper, seen, [
        ...strip.marks([frame.left, stripTop]),
        boxMark(frame, { stroke: { ink: 'ink', width: 0.7 } }),
      ]);
    },
  };
}
