import { allCrossings } from './crossings.ts';
import { createGridIndex } from './grid-index.ts';
import { chainages, lineLength, slice } from './lines.ts';
import type { RawStreet, StreetClass } from './main-streets.ts';
import { createNames } from './names.ts';
import { boundsOf, nearestOn } from './polygons.ts';
import type { Box } from './polygons.ts';
import type { Random } from './prng.ts';
import { cross, distance, itemAt, subtract } from './vector.ts';
import type { Line, Point } from './vector.ts';

export type Street = {
  readonly id: number;
  readonly name: string;
  readonly class: StreetClass;
  readonly width: number;
  readonly line: Line;
};

/** Lengths at which a street takes another name: at a crossing, some way on from the last change. */
function changesOf(street: RawStreet, crossings: readonly number[], random: Random): number[] {
  const total = lineLength(street.line);
  if (street.name !== null) return [0, total];
  const changes = [0];
  let wanted = random.range(170, 330);
  for (const at of crossings) {
    if (at - itemAt(changes, changes.length - 1) < wanted || total - at < 110) continue;
    changes.push(at);
    wanted = random.range(170, 330);
  }
  return [...changes, total];
}

/** Names every street; long ones change their names at crossings. */
export function nameStreets(streets: readonly RawStreet[], random: Random): Street[] {
  const crossings = allCrossings(streets.map(({ line }) => line));
  const given = streets.flatMap(({ name }) => name ?? []);
  const next = createNames(random, given);
  const named: Street[] = [];
  for (const [index, street] of streets.entries()) {
    const changes = changesOf(street, itemAt(crossings, index), random);
    for (let part = 1; part < changes.length; part += 1) {
      const line = slice(street.line, itemAt(changes, part - 1), itemAt(changes, part));
      const name = street.name ?? next(street.class);
      named.push({ id: named.length + 1, name, class: street.class, width: street.width, line });
    }
  }
  return named;
}

export type Frontage = {
  readonly street: Street;
  readonly chainage: number;
  readonly isLeft: boolean;
  readonly off: number;
};
export type StreetFinder = (from: Point) => Frontage | null;

type Piece = {
  readonly street: Street;
  readonly a: Point;
  readonly b: Point;
  readonly start: number;
};

function measure(from: Point, piece: Piece): Frontage {
  const near = nearestOn(from, piece.a, piece.b);
  const isLeft = cross(subtract(piece.b, piece.a), subtract(from, piece.a)) > 0;
  const off = Math.max(0, distance(near, from) - piece.street.width / 2);
  return { street: piece.street, chainage: piece.start + distance(piece.a, near), isLeft, off };
}

/** Finds the street a front looks on to. */
export function createStreetFinder(streets: readonly Street[]): StreetFinder {
  const index = createGridIndex<Piece>(40);
  for (const street of streets) {
    const stations = chainages(street.line);
    for (let at = 0; at + 1 < street.line.length; at += 1) {
      const [a, b] = [itemAt(street.line, at), itemAt(street.line, at + 1)];
      index.add(boundsOf([a, b]), { street, a, b, start: itemAt(stations, at) });
    }
  }
  return (from) => {
    for (const gap of [12, 40, 130]) {
      const box: Box = [from[0] - gap, from[1] - gap, from[0] + gap, from[1] + gap];
      const found = index
        .near(box)
        .map((piece) => measure(from, piece))
        .sort((a, b) => a.off - b.off);
      const [best] = found;
      if (best !== undefined && best.off <= gap) return best;
    }
    return null;
  };
}
