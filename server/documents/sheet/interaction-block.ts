import { categoryCurves } from '../../../shared/assessment/category-curves.ts';
import type { OpenedWall } from '../../../shared/assessment/open-wall.ts';
import type { DeepBeam } from '../../../shared/building/deep-beam.ts';
import type { StrainedZone } from '../../../shared/building/strained-zone.ts';
import { CATEGORIES, type Category } from '../../../shared/damage/categories.ts';
import {
  INTERACTION,
  interactionFrame,
  pointsBeside,
  type InteractionFrame,
} from '../../../shared/presentation/interaction-frame.ts';
import { niceTicks } from '../../../shared/presentation/nice-ticks.ts';
import { percentFromRatio } from '../../../shared/units/percent-from-ratio.ts';
import { bottomAxis, leftAxis } from '../pdf/axis.ts';
import type { Block } from '../pdf/block.ts';
import { fillCategory } from '../pdf/hatch.ts';
import { INKS } from '../pdf/inks.ts';
import { label } from '../pdf/label.ts';
import type { Paper } from '../pdf/paper.ts';
import { pixelBlock } from '../pdf/pixels.ts';
import { drawLine, trace, type Place } from '../pdf/trace.ts';
import { numberSpots } from './number-spots.ts';

const WIDTH = 460;
const { left, right, top, height } = INTERACTION;
const FOOT = top + height;
const BOUNDS = { left, top, right: WIDTH - right, bottom: FOOT };

type Drawn = {
  readonly paper: Paper;
  readonly opened: OpenedWall;
  readonly zone: StrainedZone;
  readonly beam: DeepBeam;
  readonly frame: InteractionFrame;
};

/** The categories behind the points, each hatched up to its curve; the highest lies under the others. */
function drawRegions({ paper, zone, beam, frame }: Drawn): void {
  const { doc } = paper;
  const { from, to, across, up } = frame;
  const box = () => {
    doc.rect(left, top, BOUNDS.right - left, height);
  };
  doc.save();
  box();
  doc.clip();
  fillCategory(paper, 4, box, BOUNDS);
  const curves = categoryCurves(zone.mode, beam, from, to).filter(
    ({ points }) => points.length > 0,
  );
  for (const { category, points } of curves.reverse()) {
    const line = points.map((point): Place => [
      across(point.horizontalStrain),
      up(point.deflectionRatio),
    ]);
    const ring = [...line, ...line.map(([x]): Place => [x, up(0)]).reverse()];
    const below = CATEGORIES[category - 1]?.category ?? 0;
    const shape = () => {
      trace(paper, ring, true);
    };
    fillCategory(paper, below, shape, BOUNDS);
    drawLine(paper, line, { ink: INKS.ink, width: 1 });
  }
  doc.restore();
}

function placeOf(zone: StrainedZone, { across, up }: InteractionFrame): Place {
  return [across(zone.horizontalStrain), up(zone.deflectionRatio)];
}

function ringsOf(
  opened: OpenedWall,
  zone: StrainedZone,
  frame: InteractionFrame,
): readonly Place[] {
  return pointsBeside(opened.points, zone).alike.map((point) => placeOf(point.zone, frame));
}

function drawNumber(paper: Paper, category: Category, x: number, y: number): void {
  const words = CATEGORIES[category]?.label ?? '';
  const wide = words.length > 1 ? 26 : 16;
  paper.doc
    .lineWidth(1)
    .rect(x - wide / 2, y - 8, wide, 16)
    .fillAndStroke(INKS.paper, INKS.rule);
  label(paper, words, x, y + 4, { size: 11, weight: 'strong', anchor: 'middle' });
}

function drawPoints({ paper, opened, zone, frame }: Drawn): void {
  const { doc } = paper;
  for (const [x, y] of ringsOf(opened, zone, frame)) {
    doc.lineWidth(1.2).circle(x, y, 3.2).fillAndStroke(INKS.paper, INKS.ink);
  }
  const [x, y] = placeOf(zone, frame);
  doc.lineWidth(1.8).circle(x, y, 5.2).fillAndStroke(INKS.ink, INKS.paper);
}

function drawAxes({ paper, frame }: Drawn): void {
  const { from, to, most, across, up } = frame;
  const { doc } = paper;
  const inPercent = (scale: (value: number) => number) => (percent: number) => scale(percent / 100);
  const look = { size: 11, ink: INKS.second, anchor: 'middle' } as const;
  doc
    .lineWidth(1)
    .strokeColor(INKS.ink)
    .rect(left, top, BOUNDS.right - left, height)
    .stroke();
  const strains = niceTicks(percentFromRatio(from), percentFromRatio(to), 4);
  bottomAxis(paper, { scale: inPercent(across), ticks: strains, at: FOOT });
  const ratios = niceTicks(0, percentFromRatio(most), 4);
  leftAxis(paper, { scale: inPercent(up), ticks: ratios, at: left });
  label(paper, 'Horizontal strain, %', across((from + to) / 2), FOOT + 32, look);
  doc
    .save()
    .translate(10, top + height / 2)
    .rotate(-90);
  label(paper, 'Deflection ratio Δ/L, %', 0, 0, look);
  doc.restore();
}

function draw(drawn: Drawn): void {
  const { paper, opened, zone, frame } = drawn;
  drawRegions(drawn);
  const points = [placeOf(zone, frame), ...ringsOf(opened, zone, frame)];
  for (const { category, place } of numberSpots(drawn, points)) {
    drawNumber(paper, category, ...place);
  }
  drawPoints(drawn);
  drawAxes(drawn);
}

/** Deflection ratio against horizontal strain, with the categories of the deep beam behind. */
export function interactionBlock(paper: Paper, opened: OpenedWall, zone: StrainedZone): Block {
  const { height: tall, eOverG, poisson } = opened.wall;
  const beam = { length: zone.end - zone.start, height: tall, eOverG: eOverG.central, poisson };
  const { alike } = pointsBeside(opened.points, zone);
  const frame = interactionFrame([zone, ...alike.map((point) => point.zone)], WIDTH);
  return pixelBlock(paper, FOOT + INTERACTION.foot, () => {
    draw({ paper, opened, zone, beam, frame });
  });
}

/** What the chart shows and what it leaves out. */
export function interactionWords(opened: OpenedWall, zone: StrainedZone): string {
  const { otherwise } = pointsBeside(opened.points, zone);
  const left = otherwise > 0 ? ` ${otherwise} bend the other way and are not drawn.` : '';
  return `The full dot is the central value. Curves are for the governing zone, ${zone.mode}, ${(zone.end - zone.start).toFixed(1)} m long. Rings are the rest of the nine; their zones differ in length, so that one may lie beside its own curve.${left}`;
}
