import { footprint } from './footprints.ts';
import type { Footprint, Kind } from './footprints.ts';
import { tidy } from './ground-plan.ts';
import type { GroundPlan } from './ground-plan.ts';
import type { Random } from './prng.ts';
import type { PartyLine } from './row-plan.ts';
import type { Built } from './rows.ts';
import { along, direction, left, scale } from './vector.ts';
import type { Line, Point, Ring } from './vector.ts';

/** How much is built behind the houses of a row. */
export type YardStyle = {
  readonly share: number;
  readonly paired: boolean;
  readonly width: readonly [number, number];
  readonly length: readonly [number, number];
  readonly kind: Kind;
};

export const privies: YardStyle = {
  share: 0.42,
  paired: true,
  width: [2.7, 3.6],
  length: [4.1, 5.2],
  kind: 'outbuilding',
};
export const backRanges: YardStyle = {
  share: 0.4,
  paired: false,
  width: [3.4, 5.2],
  length: [4.6, 10],
  kind: 'workshop',
};
export const sheds: YardStyle = {
  share: 0.38,
  paired: false,
  width: [3, 4.2],
  length: [4.2, 6.2],
  kind: 'garage',
};

function towards(line: PartyLine, built: Built): Point {
  const aside = left(line.inward);
  const inner = direction(built.plot.from.at, built.plot.to.at);
  const isSame = aside[0] * inner[0] + aside[1] * inner[1] > 0;
  const wanted = line === built.plot.from ? isSame : !isSame;
  return wanted ? aside : scale(aside, -1);
}

/** A small building at the end of a plot, against one of its party lines. */
function atEnd(
  built: Built,
  line: PartyLine,
  size: { width: number; length: number },
): Ring | null {
  const end = line.limit - 0.9;
  const start = end - size.length;
  if (start < built.house.depth + (built.house.wing?.length ?? 0) + 1.2) return null;
  const side = towards(line, built);
  const [a, b] = [along(line.at, line.inward, start), along(line.at, line.inward, end)];
  const ring = [a, b, along(b, side, size.width), along(a, side, size.width)];
  return tidy(line === built.plot.from ? [...ring].reverse() : ring);
}

/** Builds sheds, stores and garages behind a row. Pairs lean on the same party wall. */
export function buildYards(
  row: readonly Built[],
  ground: GroundPlan,
  style: YardStyle,
  random: Random,
): Footprint[] {
  let wanted = random.chance(style.share);
  let size = { width: random.range(...style.width), length: random.range(...style.length) };
  return row.flatMap((built, place): Footprint[] => {
    const isSecond = style.paired && place % 2 === 1;
    if (!isSecond) {
      wanted = random.chance(style.share);
      size = { width: random.range(...style.width), length: random.range(...style.length) };
    }
    if (!wanted || built.plot.corner !== null) return [];
    const line = place % 2 === 1 ? built.plot.from : built.plot.to;
    const ring = atEnd(built, line, size);
    if (ring === null || !ground.fits(ring)) return [];
    ground.build(ring);
    const kind = style.kind === 'workshop' && size.length < 5.6 ? 'outbuilding' : style.kind;
    return [footprint(ring, kind, built.footprint.front, { behind: built.footprint })];
  });
}

/** Garden walls: each party line from the back of the houses to the middle of the block. */
export function gardenWalls(row: readonly Built[]): Line[] {
  return row.flatMap(({ plot, house }) => {
    const reach = house.depth + (house.wing?.side === 'to' ? house.wing.length : 0);
    const end = Math.min(plot.to.limit, 45);
    return end - reach < 1.5
      ? []
      : [[along(plot.to.at, plot.to.inward, reach), along(plot.to.at, plot.to.inward, end)]];
  });
}
