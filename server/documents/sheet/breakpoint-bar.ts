import {
  LARGEST_VOLUME_LOSS,
  type Breakpoint,
} from '../../../shared/assessment/breakpoint-of-wall.ts';
import type { Range } from '../../../shared/numerics/range.ts';
import { percentWords } from '../../../shared/presentation/bracket-words.ts';
import { linearScale, type Scale } from '../../../shared/presentation/linear-scale.ts';
import { niceTicks } from '../../../shared/presentation/nice-ticks.ts';
import { percentFromRatio } from '../../../shared/units/percent-from-ratio.ts';
import { bottomAxis } from '../pdf/axis.ts';
import type { Block } from '../pdf/block.ts';
import { INKS } from '../pdf/inks.ts';
import { label } from '../pdf/label.ts';
import type { Paper } from '../pdf/paper.ts';
import { pixelBlock } from '../pdf/pixels.ts';
import { drawLine } from '../pdf/trace.ts';
import { figureWords } from './figures.ts';

const [HEIGHT, BAND, MEASURE, AXIS] = [84, 26, 52, 62];
const ROOM_FOR_WORDS = 80;

function drawBand(paper: Paper, across: Scale, { low, central, high }: Range): void {
  const wide = Math.max(1, across(high) - across(low));
  paper.doc
    .lineWidth(1)
    .rect(across(low), BAND - 7, wide, 14)
    .fillAndStroke(INKS.band, INKS.bandLine);
  const x = across(central);
  drawLine(paper, [[x, BAND - 9], [x, BAND + 9]], { ink: INKS.ink, width: 3 }); // prettier-ignore
}

function drawArrow(paper: Paper, at: number, volumeLoss: number, width: number): void {
  drawLine(paper, [[at, 10], [at, BAND + 9]], { ink: INKS.clay, width: 1.8 }); // prettier-ignore
  paper.doc
    .moveTo(at, 13)
    .lineTo(at - 4.5, 5)
    .lineTo(at + 4.5, 5)
    .closePath()
    .fill(INKS.clay);
  const isRight = at > width / 2;
  const look = { size: 11, weight: 'strong', ink: INKS.clayDeep } as const;
  label(paper, percentWords(volumeLoss, 2), isRight ? at - 9 : at + 9, 11, {
    ...look,
    anchor: isRight ? 'end' : 'start',
  });
}

/** Like a dimension on a drawing: from the central volume loss to the breakpoint. */
function drawReserve(paper: Paper, from: number, to: number, reserve: number): void {
  const stroke = { ink: INKS.ink, width: 0.9 };
  drawLine(paper, [[from, MEASURE], [to, MEASURE]], stroke); // prettier-ignore
  for (const x of [from, to]) drawLine(paper, [[x, MEASURE - 3], [x, MEASURE + 3]], stroke); // prettier-ignore
  if (Math.abs(to - from) < ROOM_FOR_WORDS) return;
  const words = `reserve ${figureWords(reserve, 2)}`;
  label(paper, words, (from + to) / 2, MEASURE + 3.5, {
    size: 10,
    weight: 'strong',
    anchor: 'middle',
    onPaper: true,
  });
}

type BreakpointOptions = {
  /** Undefined where none is reached. */
  readonly breakpoint: Breakpoint | undefined;
  readonly volumeLoss: Range;
  /** In pixels. */
  readonly width: number;
};

/** The volume loss that is likely, that which breaks the building, and the reserve between. */
export function breakpointBar(
  paper: Paper,
  { breakpoint, volumeLoss, width }: BreakpointOptions,
): Block {
  const broken = breakpoint?.volumeLoss;
  const end = broken === undefined ? LARGEST_VOLUME_LOSS : broken * 1.15;
  const most = Math.max(volumeLoss.high * 1.4, end);
  const across = linearScale([0, most], [8, width - 12]);
  return pixelBlock(paper, HEIGHT, () => {
    drawLine(paper, [[0, BAND], [width, BAND]], { ink: INKS.rule }); // prettier-ignore
    drawBand(paper, across, volumeLoss);
    if (breakpoint !== undefined) {
      drawArrow(paper, across(breakpoint.volumeLoss), breakpoint.volumeLoss, width);
      drawReserve(
        paper,
        across(volumeLoss.central),
        across(breakpoint.volumeLoss),
        breakpoint.reserveOverCentral,
      );
    }
    drawLine(paper, [[across(0), AXIS], [across(most), AXIS]], { ink: INKS.second }); // prettier-ignore
    bottomAxis(paper, {
      scale: (percent) => across(percent / 100),
      ticks: niceTicks(0, percentFromRatio(most), 5),
      at: AXIS,
      words: (tick) => (tick === 0 ? '0\u00a0%' : String(tick)),
    });
  });
}
