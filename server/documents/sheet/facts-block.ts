import { factsOfRun, LISTED_FACTS } from '../../../shared/presentation/facts-of-run.ts';
import { factsOf } from '../../../shared/presentation/field-words.ts';
import {
  shownValue,
  type BuildingValues,
  type OwnColumn,
} from '../../../shared/presentation/shown-value.ts';
import { beside, stack, type Block } from '../pdf/block.ts';
import { INKS } from '../pdf/inks.ts';
import type { Paper } from '../pdf/paper.ts';
import { drawLine } from '../pdf/trace.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import type { SheetParts } from './sheet-parts.ts';

const SIZE = 7.5;
const [NAME, UNIT] = [88, 16];

type Fact = {
  readonly name: string;
  readonly text: string;
  readonly unit: string;
  readonly isAssumed: boolean;
};

function factOf(column: OwnColumn, values: BuildingValues): Fact {
  const { label, unit = '' } = factsOf(column);
  const shown = shownValue(column, values);
  if (shown.kind === 'unknown')
    return { name: label, text: 'not known', unit: '', isAssumed: false };
  const isAssumed = shown.kind === 'assumed';
  const note = isAssumed ? 'assumed: ' : shown.kind === 'follows' ? 'by construction: ' : '';
  return { name: label, text: `${note}${shown.text}`, unit, isAssumed };
}

/** One fact: its name, its value, and a dotted line of clay under one that is assumed. */
function factRow(paper: Paper, { name, text, unit, isAssumed }: Fact, width: number): Block {
  const room = width - NAME - UNIT - 6;
  const left = wordsBlock(paper, name, NAME, { size: SIZE, ink: INKS.second });
  const right = wordsBlock(paper, text, room, { size: SIZE, align: 'right' });
  const after = wordsBlock(paper, unit, UNIT, { size: SIZE, ink: INKS.third });
  const height = Math.max(left.height, right.height) + 3.4;
  return {
    height,
    draw: (x, y) => {
      left.draw(x, y + 1.5);
      right.draw(x + NAME + 3, y + 1.5);
      after.draw(x + width - UNIT, y + 1.5);
      const foot = y + height;
      drawLine(paper, [[x, foot], [x + width, foot]], { ink: INKS.hairline, width: 0.5 }); // prettier-ignore
      if (!isAssumed) return;
      drawLine(paper, [[x + NAME + 40, foot - 1.4], [x + width - UNIT - 3, foot - 1.4]], { ink: INKS.clay, width: 0.9, dash: [0.9, 1.6] }); // prettier-ignore
    },
  };
}

function allFacts({ material: { building } }: SheetParts, values: BuildingValues): readonly Fact[] {
  const { reference, name, address } = building.facts;
  const named = [['Reference', reference], ['Name', name], ['Address', address]] as const; // prettier-ignore
  const called = named.flatMap(([label, text]): Fact[] =>
    text === null ? [] : [{ name: label, text, unit: '', isAssumed: false }],
  );
  return [...called, ...LISTED_FACTS.map((column) => factOf(column, values))];
}

const BETWEEN = 18;

/** What the run knew of the building, in one column or two; what the method assumes says so. */
export function factsBlock(parts: SheetParts, width: number, columns: 1 | 2): Block {
  const { paper, material, sheet } = parts;
  const values = factsOfRun(material.building, sheet);
  const each = (width - (columns - 1) * BETWEEN) / columns;
  const rows = allFacts(parts, values).map((fact) => factRow(paper, fact, each));
  const most = Math.ceil(rows.length / columns);
  const placed = [rows.slice(0, most), rows.slice(most)].map((some, k) => ({
    at: k * (each + BETWEEN),
    block: stack(some),
  }));
  const count = values.assumed.length;
  const words = `${count === 1 ? 'One value is' : `${count} values are`} assumed by the method, over dotted lines.`;
  const note = wordsBlock(paper, words, width, { size: 7, ink: INKS.second });
  return stack([beside(placed), ...(count === 0 ? [] : [note])], 4);
}
