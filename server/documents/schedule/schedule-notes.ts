import { LARGEST_VOLUME_LOSS } from '../../../shared/assessment/breakpoint-of-wall.ts';
import { CAUTIONS } from '../../../shared/cautions.ts';
import type { ColumnPart } from '../../../shared/evidence/column-part.ts';
import type { Rectangle } from '../../../shared/evidence/marks.ts';
import { noteParts } from '../../../shared/evidence/rows-part.ts';
import { revisionPart } from '../../../shared/evidence/sheet-column.ts';
import { runNotes } from '../../../shared/evidence/sheet-notes.ts';
import { percentWords } from '../../../shared/presentation/bracket-words.ts';
import { momentWords } from '../../exports/moment-words.ts';
import { drawMarks } from '../evidence/draw-marks.ts';
import type { Block } from '../pdf/block.ts';
import { POINTS_PER_MM } from '../pdf/page-sizes.ts';
import type { Paper } from '../pdf/paper.ts';
import type { ScheduleAbout, SchedulePage } from './schedule-page.ts';

const ROWS = {
  all: 'All buildings of the run.',
  affected: 'The buildings of the run that stage 1 does not let go.',
} as const;

function notesOf({ rows, askedAt, ...about }: ScheduleAbout): string[] {
  return [
    ROWS[rows],
    'Offset is from the line to the middle of a building, positive to the left. Settlement and slope are the largest over the whole range, at founding level. Strain is the largest tensile strain of the walls at the central values.',
    `Breakpoint is the volume loss at which the category that leads on is reached; none up to ${percentWords(LARGEST_VOLUME_LOSS, 0)} has a dash. So has what is not known, was not worked out, or could not be.`,
    `Decisions are those of the option as they stood when this was printed, ${momentWords(askedAt)}.`,
    ...runNotes(about),
    CAUTIONS.join(' '),
  ];
}

/** A part of a sheet's column as a block of a page. */
function blockOf(paper: Paper, seen: Rectangle, { height, marks }: ColumnPart): Block {
  return {
    height: height * POINTS_PER_MM,
    draw: (x, y) => {
      drawMarks(paper, seen, marks([x / POINTS_PER_MM, y / POINTS_PER_MM]));
    },
  };
}

/** Lines of print that are wider are hard to follow; room over the notes, in mm. */
const [WIDEST, OVER] = [190, 2.5];

/** What stands under the table: its revisions, how its figures are meant, and how far they hold. */
export function scheduleNotes(
  paper: Paper,
  { pen, seen }: SchedulePage,
  about: ScheduleAbout,
): Block[] {
  const narrow = { ...pen, width: Math.min(WIDEST, pen.width) };
  const parts = [
    ...revisionPart(narrow, about.fields),
    { height: OVER, marks: () => [] },
    ...noteParts(narrow, notesOf(about)),
  ];
  return parts.map((part) => blockOf(paper, seen, part));
}
