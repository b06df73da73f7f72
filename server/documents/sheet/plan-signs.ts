import type { PlanFrame } from '../../../shared/presentation/plan-frame.ts';
import type { Bounds } from '../pdf/hatch.ts';
import { INKS } from '../pdf/inks.ts';
import { label } from '../pdf/label.ts';
import type { Paper } from '../pdf/paper.ts';

/** In metres; the longest that takes no more than a third of the plan is drawn. */
const LENGTHS = [100, 50, 20, 10, 5];

function barOf({ pixelsPerMetre, width, height }: PlanFrame) {
  const metres = LENGTHS.find((one) => one * pixelsPerMetre <= width / 3) ?? 5;
  const long = metres * pixelsPerMetre;
  return { metres, long, left: width - long - 34, top: height - 36 };
}

/** Where the bar stands with its scale. */
export function scaleBarBounds(frame: PlanFrame): Bounds {
  const { long, left, top } = barOf(frame);
  return { left: left - 12, top: top - 2, right: left + long + 28, bottom: top + 30 };
}

/** A bar of round length with the scale, in a box over the drawing. */
export function drawScaleBar(paper: Paper, frame: PlanFrame): void {
  const { doc } = paper;
  const { metres, long, left, top } = barOf(frame);
  const box = scaleBarBounds(frame);
  const sides = [box.left, box.top, box.right - box.left, box.bottom - box.top] as const;
  doc
    .lineWidth(0.8)
    .rect(...sides)
    .fillAndStroke(INKS.paper, INKS.ink);
  for (const [k, share] of [0, 0.25, 0.5, 0.75].entries()) {
    const ink = k % 2 === 0 ? INKS.ink : INKS.paper;
    doc
      .lineWidth(0.7)
      .rect(left + share * long, top + 12, long / 4, 4)
      .fillAndStroke(ink, INKS.ink);
  }
  label(paper, '0', left, top + 9, { size: 9, anchor: 'middle' });
  label(paper, `${metres} m`, left + long, top + 9, { size: 9, anchor: 'middle' });
  const scale = `1 : ${frame.denominator}`;
  label(paper, scale, left + long / 2, top + 26, { size: 9, anchor: 'middle' });
}

const NORTH = { wide: 24, tall: 44, aside: 8 } as const;

/** Where the arrow to the north stands. */
export function northBounds({ width }: PlanFrame): Bounds {
  const right = width - NORTH.aside;
  return { left: right - NORTH.wide, top: NORTH.aside, right, bottom: NORTH.aside + NORTH.tall };
}

/** Which way north of the grid is: up. */
export function drawNorth(paper: Paper, frame: PlanFrame): void {
  const { doc } = paper;
  const { left, top } = northBounds(frame);
  const x = left + NORTH.wide / 2;
  const tip = top + 5;
  doc.lineWidth(0.8).rect(left, top, NORTH.wide, NORTH.tall).fillAndStroke(INKS.paper, INKS.ink);
  for (const aside of [5, -5]) {
    doc
      .moveTo(x, tip)
      .lineTo(x + aside, tip + 21)
      .lineTo(x, tip + 17)
      .closePath();
    doc.fillAndStroke(aside > 0 ? INKS.paper : INKS.ink, INKS.ink);
  }
  label(paper, 'N', x, top + 40, { size: 10, anchor: 'middle', weight: 'strong' });
}
