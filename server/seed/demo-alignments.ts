import type { z } from 'zod';
import type {
  AlignmentDesign,
  alignmentDesignSchema,
  newAlignmentSchema,
} from '../../shared/schemas/alignments.ts';

type Point = readonly [east: number, north: number];
type Levels = z.infer<typeof alignmentDesignSchema>['levels'];

/** The south-west corner of the demo town, from which its plans are drawn. */
const ORIGIN: Point = [412_000, 6_068_000];
const PARTS_PER_SPAN = 4;

/** Between two of four points, on a smooth curve through all of them (Catmull and Rom's). */
function curved(a: number, b: number, c: number, d: number, t: number): number {
  const [t2, t3] = [t * t, t * t * t];
  const [bend, twist] = [2 * a - 5 * b + 4 * c - d, 3 * b - a - 3 * c + d];
  return 0.5 * (2 * b + (c - a) * t + bend * t2 + twist * t3);
}

/** A smooth line through some points of the town, in the scheme's grid. */
function lineThrough(points: readonly Point[]): AlignmentDesign['line'] {
  const steps = Array.from({ length: (points.length - 1) * PARTS_PER_SPAN + 1 }, (_, k) => k);
  return steps.map((step) => {
    const span = Math.min(points.length - 2, Math.floor(step / PARTS_PER_SPAN));
    const coordinate = (axis: 0 | 1) => {
      const near = (k: number) => points[Math.max(0, Math.min(points.length - 1, k))]?.[axis] ?? 0;
      const four = [near(span - 1), near(span), near(span + 1), near(span + 2)] as const;
      return Math.round(10 * (ORIGIN[axis] + curved(...four, step / PARTS_PER_SPAN - span))) / 10;
    };
    return [coordinate(0), coordinate(1)];
  });
}

function option(
  name: string,
  points: readonly Point[],
  levels: Levels,
  more: Partial<AlignmentDesign> = {},
): z.infer<typeof newAlignmentSchema> {
  return {
    name,
    design: {
      line: lineThrough(points),
      levels,
      diameter: 6.6,
      bores: { kind: 'twin', spacing: 15, later: 'right', laterFactor: 1.2 },
      direction: 'forward',
      groundLevel: 5,
      volumeLoss: { low: 0.01, central: 0.015, high: 0.02 },
      troughWidth: { low: 0.5, central: 0.55, high: 0.6 },
      intervals: [],
      ...more,
    },
    shafts: [],
  };
}

/** Where option A runs through what filled the old harbour: more is lost, and less is known of it. */
const OLD_HARBOUR_SILT = {
  from: 1050,
  to: 1750,
  volumeLoss: { low: 0.015, central: 0.025, high: 0.038 },
  troughWidth: { low: 0.4, central: 0.45, high: 0.55 },
};

/** Three ways to take a twin-bore metro under the old harbour and the old town of Port Dogger, all invented. */
export const DEMO_ALIGNMENTS = [
  option(
    'A, Market Place',
    [[-740, 190], [-400, 220], [-60, 262], [180, 282], [310, 305], [430, 335], [550, 372], [660, 408], [760, 438], [880, 462], [1000, 474], [1340, 470], [1720, 440]],
    [{ chainage: 0, level: -13 }, { chainage: 700, level: -16 }, { chainage: 1150, level: -20 }, { chainage: 1500, level: -17 }, { chainage: 2500, level: -13 }],
    { intervals: [OLD_HARBOUR_SILT] },
  ),
  option(
    'B, harbour head',
    [[-740, 240], [-400, 320], [-60, 386], [180, 408], [400, 412], [560, 402], [760, 402], [1000, 420], [1340, 438], [1720, 440]],
    [{ chainage: 0, level: -13 }, { chainage: 900, level: -17 }, { chainage: 1200, level: -18 }, { chainage: 2500, level: -13 }],
  ),
  option(
    'C, deep and south',
    [[-740, 190], [-400, 190], [-60, 200], [200, 216], [440, 252], [600, 298], [780, 330], [1000, 350], [1340, 380], [1720, 400]],
    [{ chainage: 0, level: -17 }, { chainage: 600, level: -20 }, { chainage: 2000, level: -20 }, { chainage: 2500, level: -17 }],
    { direction: 'backward' },
  ),
]; // prettier-ignore
