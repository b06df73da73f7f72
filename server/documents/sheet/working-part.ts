import type { WorkingSection } from '../../../shared/assessment/working-of-wall.ts';
import { sourceNote } from '../../../shared/presentation/source-note.ts';
import { sourceInFull, sourceWords } from '../../../shared/presentation/source-words.ts';
import { peoplesFigure, resultWords } from '../../../shared/presentation/working-words.ts';
import type { WorkingLine } from '../../../shared/working.ts';
import { stack, type Block } from '../pdf/block.ts';
import type { Flow } from '../pdf/flow.ts';
import { INKS } from '../pdf/inks.ts';
import { flowTable, type TableColumn, type TableRow } from '../pdf/table.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import type { Piece } from '../pdf/words.ts';
import { formulaPieces, symbolPieces } from './formula-words.ts';
import type { SheetParts } from './sheet-parts.ts';
import { SHEET_WIDTH } from './sheet-width.ts';
import { heading, titled } from './titled.ts';

const COLUMNS: readonly TableColumn[] = [
  { heading: 'What', width: 128 },
  { heading: 'Formula, and with the numbers put in', width: 229 },
  { heading: 'Result', width: 82, align: 'right' },
  { heading: 'From', width: 62 },
];
/** So much of a table stands at least under its title. */
const LEAST = 70;

function equals(symbol: readonly Piece[], right: readonly Piece[]): readonly Piece[] {
  return [...symbol, { text: ' = ' }, ...right];
}

function rowsOf(line: WorkingLine): readonly TableRow[] {
  const { symbol, expression, inputs, meaning, reference } = line;
  const people = peoplesFigure(line);
  const own = symbolPieces(symbol);
  const put =
    Object.keys(inputs).length === 0
      ? []
      : [{ text: '\n= ' }, ...formulaPieces(expression, inputs)];
  return [
    {
      cells: [
        [{ text: meaning, ink: INKS.second }],
        [
          ...equals(own, formulaPieces(expression)).map((piece): Piece => ({
            weight: 'strong',
            ...piece,
          })),
          ...put,
        ],
        [
          { text: resultWords(line), weight: 'strong' },
          ...(people === null ? [] : [{ text: `\n= ${people}`, ink: INKS.second }]),
        ],
        [{ text: sourceNote(reference), ink: INKS.second }],
      ],
    },
  ];
}

function putSection(flow: Flow, { paper }: SheetParts, { title, lines }: WorkingSection): void {
  const name = wordsBlock(paper, title, SHEET_WIDTH, { size: 8.5, weight: 'strong' });
  if (!flow.hasRoom(name.height + LEAST)) flow.turn();
  flow.space(8);
  flow.put(name);
  flowTable(flow, paper, COLUMNS, lines.flatMap(rowsOf), { size: 7.5 });
}

/** The works that the lines name, in full. */
function worksBlock({ paper }: SheetParts, lines: readonly WorkingLine[]): Block {
  const keys = [...new Set(lines.map(({ reference }) => reference))].filter(
    (key) => key !== 'own' && key !== 'common-practice',
  );
  const sorted = keys.sort((a, b) => (sourceWords(a) < sourceWords(b) ? -1 : 1));
  const rows = sorted.map((key) =>
    wordsBlock(paper, sourceInFull(key), SHEET_WIDTH, { size: 7.5 }),
  );
  return titled(paper, { title: 'Works cited' }, SHEET_WIDTH, stack(rows, 2));
}

/** A working as a whole: whose it is, and its sections. */
export type WorkingPart = {
  readonly title: string;
  readonly note: string;
  readonly sections: readonly WorkingSection[];
};

/** Whole workings, line by line, and the works that they cite; nothing where there are none. */
export function putWorkings(flow: Flow, parts: SheetParts, workings: readonly WorkingPart[]): void {
  for (const [k, { title, note, sections }] of workings.entries()) {
    const head = heading(parts.paper, { title, note }, SHEET_WIDTH);
    if (k > 0) flow.space(14);
    if (!flow.hasRoom(head.height + LEAST)) flow.turn();
    flow.put(head);
    for (const section of sections) putSection(flow, parts, section);
  }
  const lines = workings.flatMap(({ sections }) => sections).flatMap((section) => section.lines);
  flow.space(12);
  flow.put(worksBlock(parts, lines));
}
