import { INK_COLOURS } from '../../../shared/evidence/ink-colours.ts';
import {
  cornersOf,
  overlap,
  type Mark,
  type Rectangle,
  type Spot,
  type Stroke,
} from '../../../shared/evidence/marks.ts';
import { POINTS_PER_MM } from '../pdf/page-sizes.ts';
import type { Paper } from '../pdf/paper.ts';
import { trace } from '../pdf/trace.ts';
import { lineOf, writeLine } from '../pdf/words.ts';
import { boundsOf, drawToned } from './draw-toned.ts';

type Rings = readonly (readonly Spot[])[];
type Of<Kind extends Mark['kind']> = Extract<Mark, { kind: Kind }>;

const SHARES = { start: 0, middle: 0.5, end: 1 } as const;

function traceRings(paper: Paper, rings: Rings, isClosed: boolean): void {
  for (const ring of rings) trace(paper, ring, isClosed);
}

function setStroke({ doc }: Paper, { ink, width, dash = [] }: Stroke): void {
  doc.lineWidth(width).lineJoin('round').strokeColor(INK_COLOURS[ink]);
  if (dash.length > 0) doc.addContent(`[${dash.join(' ')}] 0 d`);
}

function drawShape(paper: Paper, { rings, isClosed, fill, stroke }: Of<'shape'>): void {
  const { doc } = paper;
  if (fill === undefined && stroke === undefined) return;
  doc.save();
  if (stroke !== undefined) setStroke(paper, stroke);
  traceRings(paper, rings, isClosed);
  if (fill === undefined) doc.stroke();
  else if (stroke === undefined) doc.fill(INK_COLOURS[fill], 'even-odd');
  else {
    doc.fill(INK_COLOURS[fill], 'even-odd');
    traceRings(paper, rings, isClosed);
    doc.stroke();
  }
  doc.restore();
}

function drawWords(paper: Paper, mark: Of<'words'>): void {
  const { at, size, isStrong = false, ink = 'ink', anchor = 'start', along } = mark;
  const weight = isStrong ? 'strong' : 'regular';
  const look = { size: size / POINTS_PER_MM, weight, ink: INK_COLOURS[ink] } as const;
  const line = lineOf(paper, mark.words, look);
  const from = -SHARES[anchor] * line.width;
  const [x, y] = at;
  if (along === undefined) {
    writeLine(paper, line, x + from, y);
    return;
  }
  const [right, down] = along;
  paper.doc.save().transform(right, down, -down, right, x, y);
  writeLine(paper, line, from, 0);
  paper.doc.restore();
}

/** Whether some of a mark may be seen in a window; words are taken to be. */
function isSeen(mark: Mark, { left, top, right, bottom }: Rectangle): boolean {
  if (mark.kind === 'words' || mark.kind === 'within') return true;
  const bounds = boundsOf(mark.rings);
  return (
    bounds.left <= right && bounds.right >= left && bounds.top <= bottom && bounds.bottom >= top
  );
}

function drawWithin(paper: Paper, { window, marks }: Of<'within'>, seen: Rectangle): void {
  const { doc } = paper;
  doc.save();
  trace(paper, cornersOf(window), true);
  doc.clip();
  drawAll(paper, overlap(window, seen), marks);
  doc.restore();
}

function drawMark(paper: Paper, mark: Mark, seen: Rectangle): void {
  if (mark.kind === 'shape') drawShape(paper, mark);
  else if (mark.kind === 'toned') drawToned(paper, mark, seen);
  else if (mark.kind === 'words') drawWords(paper, mark);
  else drawWithin(paper, mark, seen);
}

function drawAll(paper: Paper, seen: Rectangle, marks: readonly Mark[]): void {
  for (const mark of marks) if (isSeen(mark, seen)) drawMark(paper, mark, seen);
}

/** Draws marks, which are in millimetres, on the page that is open; `seen` is all of its paper. */
export function drawMarks(paper: Paper, seen: Rectangle, marks: readonly Mark[]): void {
  paper.doc.save().scale(POINTS_PER_MM);
  drawAll(paper, seen, marks);
  paper.doc.restore();
}
