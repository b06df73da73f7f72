import { designParts } from '../../../shared/presentation/design-words.ts';
import { momentWords } from '../../exports/moment-words.ts';
import { beside, stack, type Block } from '../pdf/block.ts';
import { INKS } from '../pdf/inks.ts';
import { label } from '../pdf/label.ts';
import { PAGE_SIZES } from '../pdf/page-sizes.ts';
import type { Paper } from '../pdf/paper.ts';
import { drawLine } from '../pdf/trace.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import type { SheetMaterial } from './sheet-material.ts';
import { SHEET_WIDTH } from './sheet-width.ts';

const { width: PAGE_WIDTH, height: PAGE_HEIGHT } = PAGE_SIZES.A4;
const [TOP, FOOT] = [28, PAGE_HEIGHT - 34];
export const SHEET_LEFT = (PAGE_WIDTH - SHEET_WIDTH) / 2;

type Page = { readonly number: number; readonly count: number };
type Cell = readonly [name: string, words: string, width: number];

/** How a building is called on its sheet. */
export function buildingName({ building: { facts } }: SheetMaterial): string {
  return facts.name ?? facts.address ?? facts.reference;
}

function cellsOf(
  { run, building, printedAt }: SheetMaterial,
  { number, count }: Page,
): readonly (readonly Cell[])[] {
  const by = run.startedBy === null ? '' : `, by ${run.startedBy}`;
  return [
    [
      ['Sheet', building.facts.reference, 96],
      ['Run', String(run.number), 40],
      ['Option', `${run.option.name}, version ${run.option.version}`, 215],
      ['Method', run.methodVersion, 50],
      ['Rules', `version ${run.rulesVersion}`, 62],
      ['Register', `version ${run.registerVersion}`, 62],
    ],
    [
      ['Run started', `${momentWords(new Date(run.startedAt))}${by}`, 213],
      ['Printed', momentWords(new Date(printedAt)), 138],
      ['Figures shown', 'central values', 112],
      ['Page', `${number} of ${count}`, 62],
    ],
  ];
}

const CELL_PAD = 4;

function cellRow(paper: Paper, cells: readonly Cell[]): Block {
  let at = 0;
  const placed = cells.map(([name, words, width]) => {
    const inner = width - 2 * CELL_PAD;
    const block = stack([
      wordsBlock(paper, name, inner, { size: 6.5, ink: INKS.third }),
      wordsBlock(paper, words, inner, { size: 8, weight: 'strong' }),
    ]);
    const one = { at: at + CELL_PAD, block };
    at += width;
    return one;
  });
  const row = beside(placed);
  const height = row.height + 5;
  return {
    height,
    draw: (x, y) => {
      row.draw(x, y + 2);
      drawLine(paper, [[x, y], [x + SHEET_WIDTH, y]], { ink: INKS.ink, width: 0.6 }); // prettier-ignore
      for (const { at: left } of placed.slice(1)) {
        const side = x + left - CELL_PAD;
        drawLine(paper, [[side, y], [side, y + height]], { ink: INKS.rule, width: 0.5 }); // prettier-ignore
      }
    },
  };
}

function titleBlock(paper: Paper, material: SheetMaterial, page: Page): Block {
  const inner = SHEET_WIDTH - 2 * CELL_PAD;
  const names = stack([
    wordsBlock(paper, `${material.scheme.name}: sheet of one building`, inner, {
      size: 7.5,
      ink: INKS.second,
    }),
    wordsBlock(paper, buildingName(material), inner, { size: 13, weight: 'strong' }),
  ]);
  const rows = cellsOf(material, page).map((cells) => cellRow(paper, cells));
  const block = stack([
    {
      height: names.height + 7,
      draw: (x, y) => {
        names.draw(x + CELL_PAD, y + 3);
      },
    },
    ...rows,
  ]);
  return {
    height: block.height,
    draw: (x, y) => {
      block.draw(x, y);
      paper.doc.lineWidth(1.2).strokeColor(INKS.ink).rect(x, y, SHEET_WIDTH, block.height).stroke();
    },
  };
}

/** Where the parts of a sheet stand on a page. */
export function sheetArea(paper: Paper, material: SheetMaterial) {
  const { height } = titleBlock(paper, material, { number: 99, count: 99 });
  return { left: SHEET_LEFT, top: TOP + height + 12, bottom: FOOT - 10 };
}

function drawFoot(paper: Paper, material: SheetMaterial, { number, count }: Page): void {
  const { run, building, scheme } = material;
  const right = SHEET_LEFT + SHEET_WIDTH;
  const look = { size: 6.5, ink: INKS.second };
  drawLine(paper, [[SHEET_LEFT, FOOT], [right, FOOT]], { ink: INKS.ink, width: 0.6 }); // prettier-ignore
  const basis = wordsBlock(paper, designParts(run.design).join(' · '), SHEET_WIDTH - 150, look);
  basis.draw(SHEET_LEFT, FOOT + 3);
  const where = `${building.facts.reference}, run ${run.number}, page ${number} of ${count}`;
  label(paper, where, right, FOOT + 10, { ...look, anchor: 'end' });
  const short = scheme.name.length > 44 ? `${scheme.name.slice(0, 43)}…` : scheme.name;
  label(paper, `Groundsill · ${short}`, right, FOOT + 19, {
    ...look,
    anchor: 'end',
  });
}

/** Draws the title block and the foot on every page, once it is known how many there are. */
export function drawFrames(paper: Paper, material: SheetMaterial): void {
  const { start, count } = paper.doc.bufferedPageRange();
  for (let number = 1; number <= count; number += 1) {
    paper.doc.switchToPage(start + number - 1);
    titleBlock(paper, material, { number, count }).draw(SHEET_LEFT, TOP);
    drawFoot(paper, material, { number, count });
  }
}
