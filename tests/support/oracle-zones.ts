/** A stretch of a sampled wall bent one way, by its two ends. */
export type Piece = { readonly hogging: boolean; readonly start: number; readonly end: number };

const FLAT = 1e-8;
const SHORTEST = 0.5;

function sideOf(curvature: number): -1 | 0 | 1 {
  return Math.abs(curvature) < FLAT ? 0 : curvature > 0 ? 1 : -1;
}

/** Where a sampled quantity passes 0 between two samples, by the straight line. */
function between(x0: number, y0: number, x1: number, y1: number): number {
  return x0 + (y0 / (y0 - y1)) * (x1 - x0);
}

/**
 * Splits a wall where its sampled curvature changes sign. Flat samples make no zone, but where fewer
 * than 0.5 m of them lie between two bends the wall turns at the zero among them.
 */
export function bentPieces(x: readonly number[], curvature: readonly number[]): Piece[] {
  /** Where the curvature passes `level` between a sample and its neighbour; at the sample at an end. */
  function passing(k: number, neighbour: number, level: number): number {
    const [x0, x1] = [x[k] ?? 0, x[neighbour]];
    if (x1 === undefined) return x0;
    return between(x0, (curvature[k] ?? 0) - level, x1, (curvature[neighbour] ?? 0) - level);
  }
  const pieces: { hogging: boolean; start: number; end: number }[] = [];
  let last = -1;
  for (const [k, value] of curvature.entries()) {
    const side = sideOf(value);
    if (side === 0) continue;
    const [piece, hogging] = [pieces.at(-1), side > 0];
    const [start, end] = [passing(k, k - 1, side * FLAT), passing(k, k + 1, side * FLAT)];
    if (piece === undefined || start - piece.end > SHORTEST) {
      pieces.push({ hogging, start, end });
    } else if (piece.hogging === hogging) {
      piece.end = end;
    } else {
      let turn = last;
      while (curvature[turn + 1] !== undefined && (curvature[turn + 1] ?? 0) > 0 !== hogging)
        turn++;
      piece.end = passing(turn, turn + 1, 0);
      pieces.push({ hogging, start: piece.end, end });
    }
    last = k;
  }
  return pieces;
}

/** A piece without its ends where the wall is not affected, told by samples of `excess` < 0. */
export function affectedPart(
  { hogging, start, end }: Piece,
  x: readonly number[],
  excess: readonly number[],
): Piece | undefined {
  const inside = [...x.keys()].filter((k) => {
    const here = x[k] ?? 0;
    return here >= start && here <= end && (excess[k] ?? -1) >= 0;
  });
  const [first, last] = [inside[0], inside.at(-1)];
  if (first === undefined || last === undefined) return undefined;
  function edge(from: number, to: number, limit: number): number {
    const [a, b] = [x[from], x[to]];
    if (a === undefined || b === undefined) return limit;
    const [ea, eb] = [excess[from] ?? 0, excess[to] ?? 0];
    return eb >= 0 ? limit : between(a, ea, b, eb);
  }
  return {
    hogging,
    start: Math.max(start, edge(first, first - 1, start)),
    end: Math.min(end, edge(last, last + 1, end)),
  };
}

function lengthOf({ start, end }: Piece): number {
  return end - start;
}

/** Joins pieces under 0.5 m as the method says, the shortest first. */
export function withoutSlivers(
  pieces: readonly Piece[],
  meanCurvature: (start: number, end: number) => number,
): Piece[] {
  const [first, last] = [pieces[0], pieces.at(-1)];
  const affected = pieces.reduce((sum, piece) => sum + lengthOf(piece), 0);
  if (first === undefined || last === undefined || affected < SHORTEST) return [];
  if (pieces.every((piece) => lengthOf(piece) < SHORTEST)) {
    const [start, end] = [first.start, last.end];
    return [{ hogging: meanCurvature(start, end) > 0, start, end }];
  }
  const joined = [...pieces];
  for (;;) {
    const short = joined
      .filter((piece) => lengthOf(piece) < SHORTEST)
      .sort((a, b) => lengthOf(a) - lengthOf(b))[0];
    if (short === undefined) return joined;
    const k = joined.indexOf(short);
    const touching = [joined[k - 1], joined[k + 1]].filter(
      (piece) => piece?.end === short.start || piece?.start === short.end,
    );
    const [one, other] = touching.sort((a, b) => (b ? lengthOf(b) : 0) - (a ? lengthOf(a) : 0));
    const both = one !== undefined && one.hogging === other?.hogging;
    const members = [short, ...(one ? [one] : []), ...(both ? [other] : [])];
    const rest = joined.filter((piece) => !members.includes(piece));
    const start = Math.min(...members.map((piece) => piece.start));
    const end = Math.max(...members.map((piece) => piece.end));
    joined.splice(0, joined.length, ...rest);
    if (one) joined.push({ hogging: one.hogging, start, end });
    joined.sort((a, b) => a.start - b.start);
  }
}
