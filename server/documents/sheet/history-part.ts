import type { Flow } from '../pdf/flow.ts';
import { flowTable, type TableColumn } from '../pdf/table.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import type { SheetParts } from './sheet-parts.ts';
import { SHEET_WIDTH } from './sheet-width.ts';
import { heading, titled } from './titled.ts';

const TITLE = { title: 'Decisions, visits and measures' };
/** So much of a table stands at least under its title. */
const LEAST = 60;

const COLUMNS: readonly TableColumn[] = [
  { heading: 'Date', width: 72 },
  { heading: 'What', width: 130 },
  { heading: 'By', width: 100 },
  { heading: 'Detail', width: 199 },
];

/** What people have done since about the building, or that nobody has. */
export function putHistory(flow: Flow, { paper, material: { history } }: SheetParts): void {
  if (history.length === 0) {
    const words = wordsBlock(paper, 'Nothing has been decided yet.', SHEET_WIDTH, { size: 9 });
    flow.put(titled(paper, TITLE, SHEET_WIDTH, words));
    return;
  }
  const title = heading(paper, TITLE, SHEET_WIDTH);
  if (!flow.hasRoom(title.height + LEAST)) flow.turn();
  flow.put(title);
  const rows = history.map(({ date, what, by, detail }) => ({ cells: [date, what, by, detail] }));
  flowTable(flow, paper, COLUMNS, rows);
}
