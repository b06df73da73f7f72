import { cut, largest, offset, outers, strip, unite } from './clip.ts';
import { closedSpline, resample, spline } from './lines.ts';
import { noise } from './noise.ts';
import { boundsOf } from './polygons.ts';
import { along, cyclic, fromAngle, left, rectangle, subtract, unit } from './vector.ts';
import type { Line, Point, Ring } from './vector.ts';

/** The bank the town stands on, and the water in and around it. */
export type Water = {
  readonly coast: Ring;
  readonly harbour: Ring;
  readonly dock: Ring;
  readonly cut: Line;
  readonly cutWidth: number;
  readonly cutRings: readonly Ring[];
  /** The harbour's outline without the cut: what the quays follow. */
  readonly quayLine: Ring;
  /** All ground above water. */
  readonly land: readonly Ring[];
  /** The gap in the shore before the harbour. */
  readonly approach: Ring;
  readonly jetties: readonly Ring[];
  readonly moles: readonly Ring[];
};

/** The harbour mouth: the bank grows away from here when the town is larger. */
const mouth: Point = [312, 10];

const bank: Ring = [
  [405, -48], [520, -30], [640, -58], [770, -22], [890, 26], [990, 78], [1066, 168], [1104, 300],
  [1122, 440], [1104, 570], [1056, 690], [968, 772], [850, 810], [700, 800], [560, 786], [420, 804],
  [270, 796], [138, 742], [32, 664], [-40, 570], [-80, 460], [-74, 330], [-58, 200], [-10, 100],
  [66, 28], [150, -14], [222, -46],
]; // prettier-ignore

const harbourShape: Ring = [
  [196, -260], [214, -120], [228, -40], [256, 18], [287, 58], [287, 84], [254, 128], [240, 186],
  [250, 262], [278, 332], [322, 398], [378, 436], [430, 434], [466, 404], [472, 352], [458, 288],
  [448, 222], [424, 162], [372, 116], [335, 88], [334, 60], [360, 16], [398, -44], [420, -120], [440, -260],
]; // prettier-ignore

const cutCourse: Line = [
  [330, 392], [286, 452], [250, 520], [232, 596], [206, 672], [196, 750], [160, 830], [130, 920],
]; // prettier-ignore

function wiggle(ring: Ring, seed: number, reach: number): Ring {
  return ring.map((point, index) => {
    const outward = unit(subtract(cyclic(ring, index - 1), cyclic(ring, index + 1)));
    const [x, y] = point;
    const shift = 26 * noise(x, y, 620, seed) + 11 * noise(x, y, 230, seed + 1);
    return along(point, left(outward), shift * reach);
  });
}

function makeCoast(growth: number, seed: number): Ring {
  const grown = bank.map(([x, y]): Point => [
    mouth[0] + (x - mouth[0]) * growth,
    mouth[1] + (y - mouth[1]) * growth,
  ]);
  const curve = closedSpline(grown, 8);
  const steps = resample([...curve, cyclic(curve, 0)], 24).slice(0, -1);
  return wiggle(steps, seed, Math.min(4, growth) - 0.6);
}

/** The cut goes on to the open sea however large the bank is. */
function makeCut(growth: number): Line {
  const start = spline(cutCourse, 8);
  const end = cyclic(start, -1);
  const extra = Math.ceil(((growth - 1) * 900) / 60);
  let point = end;
  const tail: Point[] = [];
  for (let step = 1; step <= extra; step += 1) {
    point = along(point, fromAngle(1.9 + 0.35 * Math.sin(step * 0.23)), 60);
    tail.push(point);
  }
  return [...start, ...tail];
}

function makeJetties(): Ring[] {
  return [
    rectangle([283, 214], unit([60, -6]), 58, 7),
    rectangle([418, 258], unit([-50, -6]), 58, 6),
    rectangle([352, 405], unit([4, 40]), 46, 6),
    rectangle([400, 408], unit([2, 40]), 40, 5),
    rectangle([394, 176], unit([-30, 34]), 44, 5),
  ];
}

function makeMoles(): Ring[] {
  const west = spline([[214, -20], [204, -70], [222, -118], [262, -140]], 6); // prettier-ignore
  const east = spline([[410, -20], [424, -74], [408, -128], [352, -172]], 6); // prettier-ignore
  return [...strip(west, 9, 'round'), ...strip(east, 9, 'round')];
}

/** Draws the water for a bank `growth` times the size of the small town's. */
export function makeWater(growth: number, seed: number): Water {
  const coast = makeCoast(growth, seed);
  const south = boundsOf(coast)[1];
  const approach: Ring = [[200, -150], [430, -150], [470 , south - 80], [150, south - 80]]; // prettier-ignore
  const harbour = closedSpline(harbourShape, 8);
  const dock = rectangle([184, 168], unit([100, 22]), 138, 36);
  const basin = offset(offset(unite([harbour, dock]), 5, 'sharp'), -5, 'sharp');
  const course = makeCut(growth);
  const cutWidth = 13;
  const cutRings = strip(course, cutWidth, 'flat');
  const quayLine = largest(basin) ?? harbour;
  const moles = makeMoles();
  const dry = cut([coast], [quayLine, approach, ...cutRings]);
  return {
    coast,
    harbour,
    dock,
    cut: course,
    cutWidth,
    cutRings,
    quayLine,
    land: outers(dry),
    approach,
    jetties: makeJetties(),
    moles: outers(cut(moles, [coast])),
  };
}
