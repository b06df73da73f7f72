import { boundingBox } from '../../../shared/geometry/bounding-box.ts';
import { labelPlace, type PlanFrame } from '../../../shared/presentation/plan-frame.ts';
import { runContoursSchema } from '../../../shared/schemas/run-map.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { millimetresFromMetres } from '../../../shared/units/millimetres-from-metres.ts';
import type { Bounds } from '../pdf/hatch.ts';
import { INKS } from '../pdf/inks.ts';
import { label } from '../pdf/label.ts';
import type { Paper } from '../pdf/paper.ts';
import { drawLine, type Place } from '../pdf/trace.ts';
import { linesWithin } from './lines-within.ts';
import type { Outline } from './sheet-material.ts';

/** A line has a place for its label at least every so many pixels. */
const STEP = 6;
/** What a label takes on either side of its place, and how far letters of walls stand out. */
const [HALF_WIDTH, HALF_HEIGHT, LETTERS] = [22, 9, 20];

type Contour = { readonly level: number; readonly stretches: readonly (readonly PlanPoint[])[] };

/** Points close enough to each other to choose from. */
function withSteps(line: readonly PlanPoint[], pixelsPerMetre: number): readonly PlanPoint[] {
  return line.flatMap((point, k): readonly PlanPoint[] => {
    const [e, n] = line[k + 1] ?? point;
    const long = Math.hypot(e - point[0], n - point[1]) * pixelsPerMetre;
    const count = Math.max(1, Math.ceil(long / STEP));
    return Array.from({ length: count }, (_, j) => {
      const share = j / count;
      return [point[0] + share * (e - point[0]), point[1] + share * (n - point[1])] as const;
    });
  });
}

function meets([x, y]: Place, { left, top, right, bottom }: Bounds): boolean {
  return (
    x + HALF_WIDTH > left &&
    x - HALF_WIDTH < right &&
    y + HALF_HEIGHT > top &&
    y - HALF_HEIGHT < bottom
  );
}

/** Where the building stands with its letters; there no label is put. */
export function letteredBounds({ place }: PlanFrame, parts: Outline): Bounds {
  const { west, south, east, north } = boundingBox(parts.flat(2));
  const [[left, top], [right, bottom]] = [place([west, north]), place([east, south])];
  return {
    left: left - LETTERS,
    top: top - LETTERS,
    right: right + LETTERS,
    bottom: bottom + LETTERS,
  };
}

function drawLabels(
  paper: Paper,
  frame: PlanFrame,
  contours: readonly Contour[],
  isTaken: readonly Bounds[],
): void {
  const taken = [...isTaken];
  for (const { level, stretches } of contours) {
    for (const stretch of stretches) {
      const free = withSteps(stretch, frame.pixelsPerMetre).filter((point) => {
        const at = frame.place(point);
        return !taken.some((bounds) => meets(at, bounds));
      });
      const place = labelPlace(frame, free);
      if (place === null) continue;
      const [x, y] = place;
      const words = `${millimetresFromMetres(level)} mm`;
      label(paper, words, x, y + 3.2, {
        size: 9,
        ink: INKS.contour,
        anchor: 'middle',
        onPaper: true,
      });
      taken.push({
        left: x - HALF_WIDTH,
        top: y - HALF_HEIGHT,
        right: x + HALF_WIDTH,
        bottom: y + HALF_HEIGHT,
      });
    }
  }
}

/** The contours of a run with their levels, where there is room for them beside what is taken. */
export function drawContours(
  paper: Paper,
  frame: PlanFrame,
  contours: string,
  taken: readonly Bounds[],
): void {
  const all = runContoursSchema
    .parse(JSON.parse(contours))
    .map(({ level, line }): Contour => ({ level, stretches: linesWithin(line, frame.box) }));
  for (const { level, stretches } of all) {
    for (const stretch of stretches) {
      const width = level === 0.01 ? 1.6 : 0.9;
      drawLine(paper, stretch.map(frame.place), { ink: INKS.contour, width });
    }
  }
  drawLabels(paper, frame, all, taken);
}
