import { fitted } from '../../../shared/evidence/wrapped.ts';
import type { RunRow } from '../../models/find-run-rows.ts';
import { stack, type Block } from '../pdf/block.ts';
import { Flow } from '../pdf/flow.ts';
import { POINTS_PER_MM } from '../pdf/page-sizes.ts';
import type { Paper } from '../pdf/paper.ts';
import { beginTable, BETWEEN_COLUMNS, type TableColumn } from '../pdf/table.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import { SCHEDULE_COLUMNS, type ScheduleColumn } from './schedule-columns.ts';
import { scheduleNotes } from './schedule-notes.ts';
import { schedulePage, type ScheduleAbout, type SchedulePage } from './schedule-page.ts';

/** The size of words in the table, in points; so many pages to a bookmark; room over the notes. */
const [SIZES, MARKED, OVER_NOTES] = [{ A4: 6.5, A3: 8 }, 10, 8] as const;

/** A run has buildings; those that are affected may be none. */
const NONE = 'Stage 1 lets every building of the run go.';

/** A schedule that is being put on its pages. */
type Schedule = {
  readonly put: (row: RunRow) => void;
  /** How many pages there are so far. */
  readonly pages: () => number;
  /** Puts the notes under the last row; how many pages there are. */
  readonly end: () => number;
};

function columnsOf({ width }: SchedulePage): TableColumn[] {
  const shares = SCHEDULE_COLUMNS.reduce((sum, { share }) => sum + share, 0);
  const free = width - (SCHEDULE_COLUMNS.length - 1) * BETWEEN_COLUMNS;
  return SCHEDULE_COLUMNS.map(({ heading, align, share }) => ({
    ...{ heading, align, width: (share / shares) * free },
  }));
}

/** What a cell says, on one line unless its column is wrapped. */
function cellOf(
  { isWrapped, words }: ScheduleColumn,
  row: RunRow,
  { pen: { measure } }: SchedulePage,
  { width, size }: { readonly width: number; readonly size: number },
): string {
  const all = words(row);
  return isWrapped ? all : fitted(all, width / POINTS_PER_MM, measure, { size });
}

/** Blocks on one page where one can hold them all. */
function keptTogether({ area }: SchedulePage, blocks: readonly Block[]): readonly Block[] {
  const whole = stack(blocks);
  return whole.height <= area.bottom - area.top ? [whole] : blocks;
}

/** Begins a schedule of so many pages; of null it only counts them. */
export function beginSchedule(paper: Paper, about: ScheduleAbout, count: number | null): Schedule {
  const page = schedulePage(paper, about);
  const columns = columnsOf(page);
  const size = SIZES[about.paper];
  let [pages, marked, rows] = [0, 0, 0];
  const turn = () => {
    pages += 1;
    if (count !== null) page.draw(pages, count);
  };
  const flow = new Flow(page.area, turn, count !== null);
  const putCells = beginTable(flow, paper, columns, { size });
  const mark = (words: string) => {
    if (count === null || (marked > 0 && pages < marked + MARKED)) return;
    marked = pages;
    paper.doc.outline.addItem(words);
  };
  return {
    put: (row) => {
      putCells({
        cells: SCHEDULE_COLUMNS.map((column, k) =>
          cellOf(column, row, page, { width: columns[k]?.width ?? 0, size }),
        ),
      });
      rows += 1;
      mark(`Sheet ${pages}, from ${row.facts.reference}`);
    },
    pages: () => pages,
    end: () => {
      mark(`Sheet ${pages}`);
      if (rows === 0) flow.put(wordsBlock(paper, NONE, page.width, { size: 9 }));
      flow.space(OVER_NOTES);
      for (const block of keptTogether(page, scheduleNotes(paper, page, about))) flow.put(block);
      return pages;
    },
  };
}
