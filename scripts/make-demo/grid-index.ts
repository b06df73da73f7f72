import type { Box } from './polygons.ts';

/** Things filed by the squares their boxes touch. Answers come in the order of filing. */
type GridIndex<T> = {
  readonly add: (box: Box, item: T) => void;
  readonly near: (box: Box) => T[];
};

/** Squares are numbered, not named: numbers are much the quicker to look up. */
const half = 50_000;

function squaresOf(box: Box, size: number): number[] {
  const squares: number[] = [];
  for (let i = Math.floor(box[0] / size); i <= Math.floor(box[2] / size); i += 1) {
    for (let j = Math.floor(box[1] / size); j <= Math.floor(box[3] / size); j += 1) {
      squares.push((i + half) * 2 * half + j + half);
    }
  }
  return squares;
}

export function createGridIndex<T>(size: number): GridIndex<T> {
  const squares = new Map<number, { order: number; item: T }[]>();
  let count = 0;
  function add(box: Box, item: T): void {
    count += 1;
    for (const square of squaresOf(box, size)) {
      const filed = squares.get(square);
      if (filed === undefined) squares.set(square, [{ order: count, item }]);
      else filed.push({ order: count, item });
    }
  }
  function near(box: Box): T[] {
    const found = squaresOf(box, size).flatMap((square) => squares.get(square) ?? []);
    found.sort((a, b) => a.order - b.order);
    return found
      .filter(({ order }, index) => index === 0 || found[index - 1]?.order !== order)
      .map(({ item }) => item);
  }
  return { add, near };
}
