import type { Paper } from './paper.ts';

export type Place = readonly [x: number, y: number];

/** Puts a line through places into the document's path; a ring is closed. */
export function trace({ doc }: Paper, places: readonly Place[], isRing = false): void {
  for (const [k, [x, y]] of places.entries()) {
    if (k === 0) doc.moveTo(x, y);
    else doc.lineTo(x, y);
  }
  if (isRing && places.length > 0) doc.closePath();
}

type Stroke = {
  readonly ink: string;
  readonly width?: number;
  /** Lengths of dashes and gaps in turn. */
  readonly dash?: readonly number[];
};

/** Draws a line through places. */
export function drawLine(
  paper: Paper,
  places: readonly Place[],
  { ink, width = 1, dash }: Stroke,
): void {
  if (places.length < 2) return;
  const { doc } = paper;
  doc.save().lineWidth(width).strokeColor(ink);
  if (dash !== undefined) doc.addContent(`[${dash.join(' ')}] 0 d`);
  trace(paper, places);
  doc.stroke().restore();
}
