import { pieceBesideWall } from '../../../shared/assessment/piece-beside-wall.ts';
import { troughWidthMatters } from '../../../shared/ground/trough-width-matters.ts';
import { settledWords } from '../../../shared/presentation/bracket-words.ts';
import { assumedWords, plainWords } from '../../../shared/presentation/plain-words.ts';
import { reserveWords } from '../../../shared/presentation/result-words.ts';
import { strainRange } from '../../../shared/presentation/strain-range.ts';
import { beside, gap, stack, type Block } from '../pdf/block.ts';
import { INKS } from '../pdf/inks.ts';
import { POINTS_PER_PIXEL } from '../pdf/pixels.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import { bracketBlock } from './bracket-block.ts';
import { breakpointBar } from './breakpoint-bar.ts';
import { rangeBar } from './range-bar.ts';
import type { SheetParts } from './sheet-parts.ts';
import { SHEET_WIDTH } from './sheet-width.ts';
import { titled } from './titled.ts';

/** The answer in sentences for whoever has to decide, beside a line of clay. */
export function plainWordsBlock({ paper, material }: SheetParts): Block {
  const { result } = material.building;
  const assumed = assumedWords(result.assumed);
  const sentences = [...plainWords(result), ...(assumed === null ? [] : [assumed])];
  const inner = stack(
    sentences.map((words) => wordsBlock(paper, words, SHEET_WIDTH - 14, { size: 10 })),
    3,
  );
  const block = {
    height: inner.height + 4,
    draw: (x: number, y: number) => {
      paper.doc.rect(x, y, 2.5, inner.height + 4).fill(INKS.clay);
      inner.draw(x + 11, y + 2);
    },
  };
  return titled(paper, { title: 'In plain words' }, SHEET_WIDTH, block);
}

const [BRACKET, BETWEEN] = [400, 20];
const BREAKPOINT = SHEET_WIDTH / POINTS_PER_PIXEL - BRACKET - BETWEEN;

function bracketPart(
  parts: SheetParts,
  beside: NonNullable<ReturnType<typeof pieceBesideWall>>,
): Block {
  const { paper, sheet, strain, samples } = parts;
  const width = BRACKET * POINTS_PER_PIXEL;
  const { volumeLoss, troughWidth } = beside.piece;
  if (strain?.bracket === undefined) return gap(0);
  const { bracket, sensitivity } = strain;
  const ofK = troughWidthMatters(sheet.inputs.model) ? troughWidth : null;
  const inner = stack([
    bracketBlock(paper, { bracket, volumeLoss, troughWidth: ofK, width: BRACKET }),
    gap(6),
    rangeBar(paper, strainRange(bracket), BRACKET),
    // with samples the verdict is theirs and the bracket's together
    ...(sensitivity === undefined || samples !== null
      ? []
      : [
          gap(3),
          wordsBlock(paper, settledWords(sensitivity), width, { size: 8.5, weight: 'strong' }),
        ]),
  ]);
  const note = 'volume loss down, K across; the worst of all walls, strain %';
  return titled(paper, { title: 'Bracket', note }, width, inner);
}

function breakpointPart(
  { paper, material, strain }: SheetParts,
  beside: NonNullable<ReturnType<typeof pieceBesideWall>>,
): Block {
  const { result } = material.building;
  const { volumeLoss } = beside.piece;
  const breakpoint = strain?.breakpoint;
  const width = BREAKPOINT * POINTS_PER_PIXEL;
  const inner = stack([
    breakpointBar(paper, { breakpoint, volumeLoss, width: BREAKPOINT }),
    wordsBlock(paper, reserveWords(result), width, { size: 8.5 }),
  ]);
  const note = 'volume loss that makes it the category that leads on';
  return titled(paper, { title: 'Breakpoint', note }, width, inner);
}

/** Bracket and breakpoint beside each other; null where nothing could be worked out. */
export function bracketBlocks(parts: SheetParts): Block | null {
  const { sheet, strain, opened } = parts;
  const near = opened === null ? undefined : pieceBesideWall(sheet.inputs.model, opened.wall);
  if (strain?.bracket === undefined || near === undefined) return null;
  return beside([
    { at: 0, block: bracketPart(parts, near) },
    { at: (BRACKET + BETWEEN) * POINTS_PER_PIXEL, block: breakpointPart(parts, near) },
  ]);
}
