import type { OpenedWall } from '../../../shared/assessment/open-wall.ts';
import {
  MOVEMENT_FOOT,
  MOVEMENT_TOP,
  SECTION,
  SECTION_HEIGHT,
  sectionFrame,
  type SectionFrame,
} from '../../../shared/presentation/section-frame.ts';
import { millimetresFromMetres } from '../../../shared/units/millimetres-from-metres.ts';
import { bottomAxis, leftAxis } from '../pdf/axis.ts';
import type { Block } from '../pdf/block.ts';
import { INKS } from '../pdf/inks.ts';
import { label } from '../pdf/label.ts';
import type { Paper } from '../pdf/paper.ts';
import { pixelBlock } from '../pdf/pixels.ts';
import { drawLine, trace, type Place } from '../pdf/trace.ts';
import { drawChord, drawZoneGround, drawZoneStrain } from './section-zones.ts';

const WIDTH = 700;

type Drawn = {
  readonly paper: Paper;
  readonly opened: OpenedWall;
  readonly frame: SectionFrame;
};

function placesOf(
  { opened, frame }: Drawn,
  what: 'settlement' | 'settlementLow' | 'settlementHigh',
): readonly Place[] {
  return opened.section.points.map((point) => [
    frame.along(point.x),
    frame.down(millimetresFromMetres(point[what])),
  ]);
}

function drawSettlement(drawn: Drawn): void {
  const { paper, opened, frame } = drawn;
  const { doc } = paper;
  const [low, high] = [placesOf(drawn, 'settlementLow'), placesOf(drawn, 'settlementHigh')];
  doc.save().fillOpacity(0.55);
  trace(paper, [...low, ...[...high].reverse()], true);
  doc.fill(INKS.band).restore();
  drawLine(paper, low, { ink: INKS.bandLine, width: 1, dash: [1, 3] });
  drawLine(paper, high, { ink: INKS.bandLine, width: 1, dash: [5, 3] });
  const { cutOff } = opened.rules;
  const ignored = cutOff.kind === 'settlement' ? millimetresFromMetres(cutOff.settlement) : 0;
  if (ignored > 0) {
    const y = frame.down(ignored);
    const ends: Place[] = [[frame.along(0), y], [frame.along(opened.section.length), y]]; // prettier-ignore
    drawLine(paper, ends, { ink: INKS.contour, width: 0.9, dash: [5, 3] });
  }
  drawLine(paper, placesOf(drawn, 'settlement'), { ink: INKS.ink, width: 2 });
}

function drawMovement({ paper, opened, frame }: Drawn): void {
  const { along, movement } = frame;
  const { length, points } = opened.section;
  const [left, right] = [along(0), along(length)];
  const places = points.map(({ x, displacement }): Place => [
    along(x),
    movement(millimetresFromMetres(displacement)),
  ]);
  drawLine(paper, [[left, movement(0)], [right, movement(0)]], { ink: INKS.rule }); // prettier-ignore
  drawLine(paper, places, { ink: INKS.ink, width: 1.6 });
  const box = [left, MOVEMENT_TOP, right - left, MOVEMENT_FOOT - MOVEMENT_TOP] as const;
  paper.doc.lineWidth(1).strokeColor(INKS.ink).rect(...box).stroke(); // prettier-ignore
  const words = 'mm, horizontal movement along the wall; up is away from its start';
  label(paper, words, 8, MOVEMENT_TOP - 7, { size: 10, ink: INKS.second });
}

function draw(drawn: Drawn): void {
  const { paper, opened, frame } = drawn;
  const { zones, governingZone } = opened.result;
  const { along, ticks } = frame;
  const span = along(opened.section.length) - along(0);
  const foot = SECTION.top + SECTION.settlement;
  for (const zone of zones) drawZoneGround(paper, zone, frame);
  leftAxis(paper, { scale: frame.down, ticks: ticks.down, at: SECTION.left, across: span });
  drawSettlement(drawn);
  for (const [k, zone] of zones.entries()) {
    drawChord(paper, { zone, governs: k === governingZone, section: opened.section, frame });
  }
  paper.doc.lineWidth(1).strokeColor(INKS.ink);
  paper.doc.rect(SECTION.left, SECTION.top, span, SECTION.settlement).stroke();
  const words = (x: number) => `${x}\u00a0m`;
  bottomAxis(paper, { scale: along, ticks: ticks.along, at: foot, words });
  label(paper, 'mm', 8, SECTION.top - 8, { size: 10, ink: INKS.second });
  for (const zone of zones) drawZoneStrain(paper, zone, frame);
  leftAxis(paper, { scale: frame.movement, ticks: ticks.movement, at: SECTION.left });
  drawMovement(drawn);
}

/** Settlement along a wall with its zones, chords and strains, and the horizontal movement beneath. */
export function sectionBlock(paper: Paper, opened: OpenedWall): Block {
  const frame = sectionFrame(opened.section, WIDTH);
  return pixelBlock(paper, SECTION_HEIGHT, () => {
    draw({ paper, opened, frame });
  });
}
