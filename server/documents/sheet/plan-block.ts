import { footprintMiddle } from '../../../shared/building/footprint-middle.ts';
import { DAMAGE } from '../../../shared/presentation/damage-style.ts';
import type { PlanFrame } from '../../../shared/presentation/plan-frame.ts';
import { stack, type Block } from '../pdf/block.ts';
import { fillCategory } from '../pdf/hatch.ts';
import { INKS } from '../pdf/inks.ts';
import { label } from '../pdf/label.ts';
import type { Paper } from '../pdf/paper.ts';
import { pixelBlock, POINTS_PER_PIXEL } from '../pdf/pixels.ts';
import { drawLine, trace } from '../pdf/trace.ts';
import { wordsBlock } from '../pdf/words-block.ts';
import { linesWithin } from './lines-within.ts';
import { sheetPlanFrame } from './plan-frame-of-sheet.ts';
import { LETTER_RADIUS, letterSpots, type LetterSpot } from './plan-letters.ts';
import { drawContours, letteredBounds } from './plan-contours.ts';
import { drawNorth, drawScaleBar, northBounds, scaleBarBounds } from './plan-signs.ts';
import type { Outline } from './sheet-material.ts';
import type { SheetParts } from './sheet-parts.ts';

type Drawn = { readonly parts: SheetParts; readonly frame: PlanFrame };

function traceOutline({ parts: { paper }, frame }: Drawn, outline: Outline): void {
  for (const ring of outline.flat()) trace(paper, ring.map(frame.place), true);
}

function drawBuildings(drawn: Drawn): void {
  const { width, height } = drawn.frame;
  const { paper, material } = drawn.parts;
  const { doc } = paper;
  const { facts, result } = material.building;
  doc.lineWidth(0.8).strokeColor(INKS.buildingEdge);
  for (const outline of material.neighbours) {
    traceOutline(drawn, outline);
    doc.stroke();
  }
  const shape = () => {
    traceOutline(drawn, facts.parts);
  };
  const bounds = { left: 0, top: 0, right: width, bottom: height };
  if (result.category !== null) fillCategory(paper, result.category, shape, bounds);
  shape();
  doc
    .lineWidth(1)
    .strokeColor(result.category === null ? INKS.ink : DAMAGE[result.category].edge)
    .stroke();
}

function drawDrives({ parts: { paper, sheet }, frame }: Drawn): void {
  for (const { axis } of sheet.inputs.model.drives) {
    const line = axis.map(([e, n]) => [e, n] as const);
    for (const stretch of linesWithin(line, frame.box)) {
      drawLine(paper, stretch.map(frame.place), { ink: INKS.ink, width: 1.2, dash: [9, 3, 2, 3] });
    }
  }
}

function drawLetter(
  paper: Paper,
  name: string,
  { wall, letter }: LetterSpot,
  governs: boolean,
): void {
  const [x, y] = letter;
  const edge = governs ? INKS.clay : INKS.ink;
  drawLine(paper, [wall, letter], { ink: edge, width: 0.6 });
  paper.doc
    .lineWidth(1)
    .circle(x, y, LETTER_RADIUS)
    .fillAndStroke(governs ? INKS.clay : INKS.paper, edge);
  label(paper, name, x, y + 3.3, {
    size: 9,
    anchor: 'middle',
    ink: governs ? INKS.paper : INKS.ink,
  });
}

function drawWalls({ parts: { paper, sheet, strain }, frame }: Drawn): void {
  const { prepared } = sheet;
  const governing = strain?.walls[strain.governing];
  for (const [k, { segment }] of prepared.walls.entries()) {
    const governs = governing?.wallIndex === k;
    const ends = [frame.place(segment.start), frame.place(segment.end)];
    drawLine(paper, ends, { ink: governs ? INKS.clay : INKS.ink, width: governs ? 4 : 1.4 });
  }
  if (governing?.joined === true) {
    const { start, end } = governing.wall.segment;
    drawLine(paper, [frame.place(start), frame.place(end)], {
      ink: INKS.clay,
      width: 1.6,
      dash: [5, 3],
    });
  }
  const spots = letterSpots(frame, prepared.walls, footprintMiddle([prepared.rings]));
  for (const [k, { name }] of prepared.walls.entries()) {
    const spot = spots[k];
    if (spot !== undefined) drawLetter(paper, name, spot, governing?.wallIndex === k);
  }
}

function captionOf({ parts: { strain }, frame }: Drawn): string {
  const governing = strain?.walls[strain.governing];
  const walls =
    governing === undefined
      ? 'Walls by letter.'
      : `Walls by letter; the clay one, ${governing.wall.name}, governs${governing.joined ? ' with the row it stands in' : ''}.`;
  return `Scale 1 : ${frame.denominator} on A4. ${walls} Blue: central settlement at the ground. Broken line: axis of a drive.`;
}

/** The building in plan with its walls by letter, what stands round it, the drives and the run's contours. */
export function planBlock(parts: SheetParts): Block & { readonly width: number } {
  const { paper, material } = parts;
  const { doc } = paper;
  const frame = sheetPlanFrame(material.building.facts.parts);
  const drawn = { parts, frame };
  const taken = [
    letteredBounds(frame, material.building.facts.parts),
    scaleBarBounds(frame),
    northBounds(frame),
  ];
  const plan = pixelBlock(paper, frame.height, () => {
    doc.save();
    doc.rect(0, 0, frame.width, frame.height).clip();
    drawBuildings(drawn);
    drawDrives(drawn);
    drawContours(paper, frame, material.contours, taken);
    drawWalls(drawn);
    drawScaleBar(paper, frame);
    drawNorth(paper, frame);
    doc.restore();
    doc.lineWidth(1.2).strokeColor(INKS.ink).rect(0, 0, frame.width, frame.height).stroke();
  });
  const width = frame.width * POINTS_PER_PIXEL;
  const caption = wordsBlock(paper, captionOf(drawn), width, { size: 7, ink: INKS.second });
  return { ...stack([plan, caption], 3), width };
}
