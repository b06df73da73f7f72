import type { LetterTextPart } from '../../../shared/presentation/letter-text.ts';
import { gap, stack, type Block } from '../pdf/block.ts';
import { bullets } from '../pdf/bullets.ts';
import { Flow } from '../pdf/flow.ts';
import { INKS } from '../pdf/inks.ts';
import { label } from '../pdf/label.ts';
import { PAGE_SIZES, POINTS_PER_MM } from '../pdf/page-sizes.ts';
import { bytesOf, openPaper, type Paper } from '../pdf/paper.ts';
import { flowTable, type TableColumn } from '../pdf/table.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import type { LetterOnPaper, LettersMaterial } from './letter-material.ts';

function mm(length: number): number {
  return length * POINTS_PER_MM;
}

const { width: PAGE_WIDTH, height: PAGE_HEIGHT } = PAGE_SIZES.A4;
const LEFT = mm(25);
const WIDTH = PAGE_WIDTH - LEFT - mm(22);

/** Where a long envelope has its window once the sheet is folded in three; common practice, no source. */
const WINDOW = { left: mm(25), top: mm(50), width: mm(80), height: mm(32) };

const AREA = { left: LEFT, top: mm(24), bottom: PAGE_HEIGHT - mm(24) };
const LOOK = { size: 10.5 };
const LIST_LOOK = { ...LOOK, indent: 12, between: 2 };
const SMALL = { size: 8, ink: INKS.second };
const BETWEEN = 7;

function partBlock(paper: Paper, part: LetterTextPart, page: string): Block {
  if (typeof part === 'string') return wordsBlock(paper, part, WIDTH, LOOK);
  if ('list' in part) return bullets(paper, part.list, WIDTH, LIST_LOOK);
  return wordsBlock(paper, page, WIDTH, { ...LOOK, weight: 'strong' });
}

/** As many lines of a name and an address as the window shows. */
function addressBlock(paper: Paper, { name, address }: LetterOnPaper): Block {
  const lines = [name, ...address.split('\n')];
  for (const size of [10.5, 9, 7.5, 6]) {
    const block = stack(lines.map((line) => wordsBlock(paper, line, WINDOW.width, { size })));
    if (block.height <= WINDOW.height) return block;
  }
  const short = lines.map((line) => Array.from(line).slice(0, 60).join(''));
  return stack(short.map((line) => wordsBlock(paper, line, WINDOW.width, { size: 6 })));
}

function drawHead(paper: Paper, material: LettersMaterial, letter: LetterOnPaper): void {
  const { schemeName, sender, day } = material;
  wordsBlock(paper, schemeName, WIDTH, { size: 13, weight: 'strong' }).draw(LEFT, mm(16));
  const right = LEFT + WIDTH - mm(58);
  const who = sender.map((line) => wordsBlock(paper, line, mm(58), SMALL));
  stack([...who, gap(6), wordsBlock(paper, day, mm(58), LOOK)]).draw(right, WINDOW.top);
  const back = wordsBlock(paper, sender.join(', '), WINDOW.width, { size: 6, ink: INKS.second });
  back.draw(WINDOW.left, WINDOW.top - back.height - 2);
  addressBlock(paper, letter).draw(WINDOW.left, WINDOW.top);
}

/** Writes one letter from a new page on; how many pages it has. */
function putLetter(paper: Paper, material: LettersMaterial, letter: LetterOnPaper): number {
  const first = paper.doc.bufferedPageRange().count;
  const flow = new Flow(AREA, () => {
    paper.doc.addPage({ size: [PAGE_WIDTH, PAGE_HEIGHT], margin: 0 });
  });
  paper.doc.outline.addItem(`${letter.mark} ${letter.name}`.slice(0, 120));
  drawHead(paper, material, letter);
  flow.put(gap(mm(95) - AREA.top));
  flow.put(wordsBlock(paper, letter.subject, WIDTH, { size: 12, weight: 'strong' }));
  for (const part of letter.parts) {
    flow.space(BETWEEN);
    flow.put(partBlock(paper, part, material.page));
  }
  const count = paper.doc.bufferedPageRange().count - first;
  for (let k = 0; k < count; k += 1) {
    paper.doc.switchToPage(first + k);
    const foot = `Letter ${letter.mark}, page ${k + 1} of ${count}`;
    label(paper, foot, LEFT + WIDTH, PAGE_HEIGHT - mm(14), { ...SMALL, anchor: 'end' });
  }
  return count;
}

const MANIFEST: readonly TableColumn[] = [
  { heading: 'Letter', width: 52 },
  { heading: 'To', width: 150 },
  { heading: 'Address', width: 180 },
  { heading: 'Pages', width: 34, align: 'right' },
];

function putManifest(paper: Paper, material: LettersMaterial, pages: readonly number[]): void {
  const flow = new Flow(AREA, () => {
    paper.doc.addPage({ size: [PAGE_WIDTH, PAGE_HEIGHT], margin: 0 });
  });
  paper.doc.outline.addItem('Manifest');
  const all = pages.reduce((sum, count) => sum + count, 0);
  const title = `${material.letters.length} letters for the post, ${all} pages`;
  flow.put(wordsBlock(paper, material.schemeName, WIDTH, { ...LOOK, ink: INKS.second }));
  flow.put(wordsBlock(paper, title, WIDTH, { size: 14, weight: 'strong' }));
  flow.put(wordsBlock(paper, material.day, WIDTH, LOOK));
  flow.space(12);
  const rows = material.letters.map(({ mark, name, address }, k) => ({
    cells: [mark, name, address.replaceAll('\n', ', '), String(pages[k] ?? 0)],
  }));
  flowTable(flow, paper, MANIFEST, rows);
}

function openLetters({ schemeName, letters, day }: LettersMaterial): Paper {
  const [first] = letters;
  const one = letters.length === 1 && first !== undefined ? first.subject : 'Letters for the post';
  return openPaper({ size: 'A4', title: one, author: schemeName, subject: day, at: new Date(0) });
}

/** Letters on paper, upright A4, their addresses where the window of an envelope is. */
export async function lettersDocument(material: LettersMaterial): Promise<Uint8Array> {
  const paper = openLetters(material);
  if (material.hasManifest) {
    const trial = openLetters(material);
    const pages = material.letters.map((letter) => putLetter(trial, material, letter));
    putManifest(paper, material, pages);
  }
  for (const letter of material.letters) putLetter(paper, material, letter);
  return bytesOf(paper);
}
