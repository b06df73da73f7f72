import { boundingBox, type Box } from '../geometry/bounding-box.ts';
import { planDistance } from '../geometry/plan-distance.ts';
import type { PlanPoint } from '../geometry/point.ts';
import type { ColumnPart, ColumnPen } from './column-part.ts';
import { backgroundMarks } from './background-marks.ts';
import { groundFrame, type GroundFrame } from './ground-frame.ts';
import { boxMark, cornersOf, lineMark, type Mark, type Rectangle, type Spot } from './marks.ts';
import type { PlanBackground } from './plan-material.ts';
import type { PlannedSheet } from './planned-sheets.ts';

/** How high a key plan is on A3, and what stays free round what it shows, in mm. */
const [TALL, MARGIN] = [27, 2.5];
const NUMBER = 6.5;
/** A neighbour has its number where its frame is so wide on the key plan, in mm. */
const WIDE = 7;

/** The frames of the plans among some sheets, by number. */
function framesOf(all: readonly PlannedSheet[]): { number: number; frame: GroundFrame }[] {
  return all.flatMap(({ number, what }) =>
    what.kind === 'plan' ? [{ number, frame: what.frame }] : [],
  );
}

function frameAround(window: Rectangle, { west, south, east, north }: Box): GroundFrame {
  const inside = {
    wide: window.right - window.left - 2 * MARGIN,
    tall: window.bottom - window.top - 2 * MARGIN,
  };
  const denominator =
    1000 * Math.max((east - west) / inside.wide, (north - south) / inside.tall, 0.001);
  return groundFrame(window, { centre: [(west + east) / 2, (south + north) / 2], denominator });
}

function sheetMarks(
  key: GroundFrame,
  { number, frame }: { number: number; frame: GroundFrame },
  isThis: boolean,
): Mark[] {
  const ring = cornersOf(frame.window).map((corner): Spot => key.place(frame.ground(corner)));
  const [x, y] = key.place(frame.ground([
    (frame.window.left + frame.window.right) / 2,
    (frame.window.top + frame.window.bottom) / 2,
  ])); // prettier-ignore
  const [first, second] = ring;
  const isWide = first !== undefined && second !== undefined && planDistance(first, second) >= WIDE;
  const outline: Mark = {
    ...{ kind: 'shape', rings: [ring], isClosed: true },
    ...(isThis && { fill: 'band' }),
    stroke: { ink: 'ink', width: isThis ? 0.5 : 0.2 },
  };
  if (!isThis && !isWide) return [outline];
  const words = String(number);
  const look = { size: NUMBER, isStrong: isThis, anchor: 'middle' } as const;
  return [outline, { kind: 'words', words, at: [x, y + 0.8], ...look }];
}

type Key = {
  readonly line: readonly PlanPoint[];
  readonly all: readonly PlannedSheet[];
  readonly number: number;
  readonly ground: readonly PlanBackground[];
};

/**
 * Where a sheet lies on the line, with the other sheets of its print; grid north is up.
 *
 * Units: mm. Valid: any sheets. Source: [own].
 */
export function keyPart(pen: ColumnPen, { line, all, number, ground }: Key): ColumnPart {
  const height = TALL * pen.scale;
  const frames = framesOf(all);
  const corners = frames.flatMap(({ frame }) => cornersOf(frame.window).map(frame.ground));
  const box = boundingBox([...line, ...corners]);
  // this sheet's ground first, so that the numbers of its neighbours stay readable
  const [own, others] = [true, false].map((isOwn) =>
    frames.filter((one) => (one.number === number) === isOwn),
  );
  return {
    height: height + 1,
    marks: ([x, y]) => {
      const window = { left: x, top: y, right: x + pen.width, bottom: y + height };
      const key = frameAround(window, box);
      const marks = [
        ...backgroundMarks(key, ground),
        ...(own ?? []).flatMap((one) => sheetMarks(key, one, true)),
        ...(others ?? []).flatMap((one) => sheetMarks(key, one, false)),
        lineMark(line.map(key.place), { ink: 'ink', width: 0.5 }),
      ];
      return [
        { kind: 'within', window, marks },
        boxMark(window, { stroke: { ink: 'rule', width: 0.18 } }),
      ];
    },
  };
}
