import type { OpenedWall } from '../../../shared/assessment/open-wall.ts';
import { beside, gap, stack, type Block } from '../pdf/block.ts';
import { Flow } from '../pdf/flow.ts';
import { INKS } from '../pdf/inks.ts';
import { bytesOf, openPaper, type Paper } from '../pdf/paper.ts';
import { PAGE_SIZES } from '../pdf/page-sizes.ts';
import { flowTable, tableBlock } from '../pdf/table.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import { bracketBlocks, plainWordsBlock } from './answer-blocks.ts';
import { categoryKey } from './category-key.ts';
import { cautionsBlock } from './cautions-block.ts';
import { factsBlock } from './facts-block.ts';
import { putHistory } from './history-part.ts';
import { interactionBlock, interactionWords } from './interaction-block.ts';
import { buildingName, drawFrames, sheetArea } from './page-frame.ts';
import { planBlock } from './plan-block.ts';
import { sectionBlock } from './section-block.ts';
import { samplesBlock, samplesWorking } from './samples-block.ts';
import type { SheetMaterial } from './sheet-material.ts';
import { sheetParts, type SheetParts } from './sheet-parts.ts';
import { SHEET_WIDTH } from './sheet-width.ts';
import { stageBlocks } from './stage-blocks.ts';
import { titled, heading } from './titled.ts';
import { verdictBlock } from './verdict-block.ts';
import { WALL_COLUMNS, wallRows } from './walls-table.ts';
import { putWorkings, type WorkingPart } from './working-part.ts';
import { ZONE_COLUMNS, zoneRows } from './zones-table.ts';

const BETWEEN = 14;

/** The plan with the facts beside it, or under it where it takes the whole width. */
function placeBlock(parts: SheetParts): Block {
  const { paper } = parts;
  const plan = planBlock(parts);
  const isWide = plan.width >= SHEET_WIDTH;
  const at = isWide ? 0 : plan.width + 18;
  const width = SHEET_WIDTH - at;
  const about = { title: 'Facts', note: 'as the run took them' };
  const facts = titled(paper, about, width, factsBlock(parts, width, isWide ? 2 : 1));
  const where = { title: 'Where it stands', note: 'grid north is up' };
  const stands = titled(paper, where, plan.width, plan);
  if (isWide) return stack([stands, facts], 8);
  return beside([
    { at: 0, block: stands },
    { at, block: facts },
  ]);
}

function interactionPart({ paper, opened }: SheetParts): Block | null {
  const zone = opened?.result.zones[opened.result.governingZone];
  if (opened === null || zone === undefined) return null;
  const at = 345 + 16;
  const width = SHEET_WIDTH - at;
  const aside = stack([
    categoryKey(paper, width),
    gap(8),
    wordsBlock(paper, interactionWords(opened, zone), width, { size: 7.5, ink: INKS.second }),
  ]);
  const chart = beside([
    { at: 0, block: interactionBlock(paper, opened, zone) },
    { at, block: aside },
  ]);
  const note = `wall ${opened.wall.name}; nine points of the bracket`;
  return titled(paper, { title: 'Category by strain', note }, SHEET_WIDTH, chart);
}

/** Why a sheet has no strains. */
function withoutStrain({ material: { building } }: SheetParts): string {
  const { fault, stage } = building.result;
  if (fault !== null) return fault;
  return stage === 1
    ? 'Screening lets the building go, so no strain of its walls is on record. The screen opens its walls all the same.'
    : 'This building has no wall that could be worked out.';
}

function sectionPart(parts: SheetParts): Block {
  const { paper, opened } = parts;
  if (opened === null) {
    const words = wordsBlock(paper, withoutStrain(parts), SHEET_WIDTH, { size: 9 });
    return titled(paper, { title: 'Strain stage' }, SHEET_WIDTH, words);
  }
  const title = `Wall ${opened.wall.name}, which governs`;
  const note =
    'settlement at the central values; the band is the bracket, its dotted edge low and its dashed edge high; clay lines are chords; what settles less than the blue broken line is ignored';
  const zones =
    opened.result.zones.length === 0
      ? wordsBlock(paper, 'The wall is not affected: it has no zone.', SHEET_WIDTH, { size: 8.5 })
      : tableBlock(paper, ZONE_COLUMNS, zoneRows(opened));
  return titled(
    paper,
    { title, note },
    SHEET_WIDTH,
    stack([sectionBlock(paper, opened), gap(6), zones]),
  );
}

/** A bookmark to the page that is being written. */
function mark({ doc }: Paper, title: string): void {
  doc.outline.addItem(title);
}

function putPart(flow: Flow, paper: Paper, title: string, block: Block | null): void {
  if (block === null) return;
  flow.space(BETWEEN);
  if (!flow.hasRoom(block.height)) flow.turn();
  mark(paper, title);
  flow.put(block);
}

function putWalls(flow: Flow, { paper, strain }: SheetParts): void {
  if (strain === null || strain.walls.length === 0) return;
  const head = heading(
    paper,
    { title: 'Walls', note: 'at the central values, alone and in the row they stand in' },
    SHEET_WIDTH,
  );
  flow.space(BETWEEN);
  if (!flow.hasRoom(head.height + 60)) flow.turn();
  mark(paper, 'Walls');
  flow.put(head);
  flowTable(flow, paper, WALL_COLUMNS, wallRows(strain));
}

function wallWorking({ wall, working }: OpenedWall): WorkingPart {
  return {
    title: `Working of wall ${wall.name}`,
    note: 'at the central values; each formula, the numbers put in, what came out, and where the formula is from',
    sections: working,
  };
}

function putAnswers(flow: Flow, parts: SheetParts): void {
  const { paper, opened } = parts;
  putPart(flow, paper, 'In plain words', plainWordsBlock(parts));
  putPart(flow, paper, 'Bracket and breakpoint', bracketBlocks(parts));
  putPart(flow, paper, 'Sampled run', samplesBlock(parts));
  putPart(flow, paper, 'Stage and holds', stageBlocks(parts));
  putPart(flow, paper, 'Cautions', cautionsBlock(paper));
  flow.space(BETWEEN);
  mark(paper, 'Decisions, visits and measures');
  putHistory(flow, parts);
  const workings = [...(opened === null ? [] : [wallWorking(opened)]), ...samplesWorking(parts)];
  if (workings.length === 0) return;
  flow.space(BETWEEN);
  mark(paper, 'Working');
  putWorkings(flow, parts, workings);
}

/** The sheet of one building in one run as a PDF, upright A4. */
export async function sheetDocument(material: SheetMaterial): Promise<Uint8Array> {
  const { scheme, run, building, printedAt } = material;
  const paper = openPaper({
    size: 'A4',
    title: `Sheet ${building.facts.reference}, ${buildingName(material)}, run ${run.number}`,
    author: scheme.name,
    subject: `${run.option.name}, version ${run.option.version}; method ${run.methodVersion}, rules version ${run.rulesVersion}`,
    at: new Date(printedAt),
  });
  const parts = sheetParts(paper, material);
  const { width, height } = PAGE_SIZES.A4;
  const flow = new Flow(sheetArea(paper, material), () => {
    paper.doc.addPage({ size: [width, height], margin: 0 });
  });
  mark(paper, 'Answer');
  flow.put(verdictBlock(parts));
  putPart(flow, paper, 'Where and what', placeBlock(parts));
  putWalls(flow, parts);
  putPart(flow, paper, 'Section', sectionPart(parts));
  putPart(flow, paper, 'Category by strain', interactionPart(parts));
  putAnswers(flow, parts);
  drawFrames(paper, material);
  return bytesOf(paper);
}
