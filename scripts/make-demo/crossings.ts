import { createGridIndex } from './grid-index.ts';
import { chainages, lineLength, slice } from './lines.ts';
import { boundsOf, crossing } from './polygons.ts';
import { along, cyclic, direction, distance, dot, itemAt } from './vector.ts';
import type { Line, Point } from './vector.ts';

type Piece = {
  readonly street: number;
  readonly a: Point;
  readonly b: Point;
  readonly start: number;
  readonly size: number;
};
type Finder = ReturnType<typeof createFinder>;

function piecesOf(line: Line, street: number): Piece[] {
  const stations = chainages(line);
  return line.slice(1).map((b, index) => {
    const a = itemAt(line, index);
    return { street, a, b, start: itemAt(stations, index), size: distance(a, b) };
  });
}

/** Finds where lines cross one another. */
function createFinder(lines: readonly Line[]) {
  const index = createGridIndex<Piece>(30);
  for (const [street, line] of lines.entries()) {
    for (const piece of piecesOf(line, street)) index.add(boundsOf([piece.a, piece.b]), piece);
  }
  return index;
}

/** Lengths along a line at which other lines cross or touch it, in order. */
function crossingsOf(line: Line, street: number, finder: Finder): number[] {
  const found: number[] = [];
  for (const own of piecesOf(line, street)) {
    for (const other of finder.near(boundsOf([own.a, own.b]))) {
      if (other.street === street) continue;
      const hit = crossing(own.a, own.b, other.a, other.b);
      if (hit !== null) found.push(own.start + hit.first * own.size);
    }
  }
  return found
    .sort((a, b) => a - b)
    .filter((at, index, all) => index === 0 || at - itemAt(all, index - 1) > 1);
}

export function allCrossings(lines: readonly Line[]): number[][] {
  const finder = createFinder(lines);
  return lines.map((line, street) => crossingsOf(line, street, finder));
}

/** How far ahead of a line's end another street lies, when it is met at a fair angle. */
function reachAhead(
  end: Point,
  way: Point,
  street: number,
  finder: Finder,
  limit: number,
): number | null {
  const tip = along(end, way, limit);
  let nearest: number | null = null;
  for (const other of finder.near(boundsOf([end, tip]))) {
    const hit = other.street === street ? null : crossing(end, tip, other.a, other.b);
    if (hit === null || Math.abs(dot(direction(other.a, other.b), way)) > 0.86) continue;
    const reach = hit.first * limit;
    if (nearest === null || reach < nearest) nearest = reach;
  }
  return nearest;
}

function stubAtEnd(line: Line, street: number, finder: Finder): number | null {
  const last = crossingsOf(line, street, finder).at(-1);
  return last === undefined ? null : lineLength(line) - last;
}

function isOpenWay(
  from: Point,
  way: Point,
  reach: number,
  allows: (at: Point) => boolean,
): boolean {
  const steps = Math.floor((reach - 8) / 5);
  return Array.from({ length: Math.max(0, steps) }, (_, index) => index + 1).every((step) =>
    allows(along(from, way, step * 5)),
  );
}

/** Carries a line on to a street ahead of its end, if there is one. */
function carryOn(line: Line, street: number, finder: Finder, allows: (at: Point) => boolean): Line {
  const stub = stubAtEnd(line, street, finder);
  if (stub !== null && stub < 3) return line;
  const [end, before] = [cyclic(line, -1), cyclic(line, -3)];
  const way = direction(before, end);
  const reach = reachAhead(end, way, street, finder, 70);
  return reach === null || !isOpenWay(end, way, reach, allows)
    ? line
    : [...line, along(end, way, reach + 0.6)];
}

/** Cuts a line back to the last street it crosses, or to a stub beyond it. */
function cutBack(line: Line, street: number, finder: Finder, deadEnd: number): Line {
  const stub = stubAtEnd(line, street, finder);
  if (stub === null || stub < 3) return line;
  const keep = stub > 24 ? Math.min(stub, deadEnd) : 0.6;
  return slice(line, 0, lineLength(line) - stub + keep);
}

type EndRule = (line: Line, street: number, finder: Finder) => Line;

function atBothEnds(
  lines: readonly Line[],
  isFixed: (street: number) => boolean,
  rule: EndRule,
): Line[] {
  const finder = createFinder(lines);
  return lines.map((line, street) => {
    if (isFixed(street)) return line;
    const ahead = rule(line, street, finder);
    return [...rule([...ahead].reverse(), street, finder)].reverse();
  });
}

/** Settles both ends of every line that is free to move. `deadEnd` draws how long a stub may stay. */
export function settleEnds(
  lines: readonly Line[],
  rules: {
    isFixed: (street: number) => boolean;
    allows: (at: Point) => boolean;
    deadEnd: () => number;
  },
): Line[] {
  const carried = atBothEnds(lines, rules.isFixed, (line, street, finder) =>
    carryOn(line, street, finder, rules.allows),
  );
  return atBothEnds(carried, rules.isFixed, (line, street, finder) =>
    cutBack(line, street, finder, rules.deadEnd()),
  );
}
