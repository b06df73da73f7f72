import { distance } from './vector.ts';
import type { Line, Point } from './vector.ts';

/** Keeps the points of streets of one family, so that a new one can stay clear of them. */
export type Tracks = {
  readonly add: (line: Line) => void;
  readonly isClear: (at: Point, gap: number) => boolean;
};

const square = 40;

export function createTracks(): Tracks {
  const squares = new Map<number, Point[]>();
  function keyOf(i: number, j: number): number {
    return (i + 4096) * 8192 + j + 4096;
  }
  function addLine(line: Line): void {
    for (const point of line) {
      const key = keyOf(Math.floor(point[0] / square), Math.floor(point[1] / square));
      const filed = squares.get(key);
      if (filed === undefined) squares.set(key, [point]);
      else filed.push(point);
    }
  }
  function isClear(at: Point, gap: number): boolean {
    const [west, east] = [Math.floor((at[0] - gap) / square), Math.floor((at[0] + gap) / square)];
    const [south, north] = [Math.floor((at[1] - gap) / square), Math.floor((at[1] + gap) / square)];
    for (let i = west; i <= east; i += 1) {
      for (let j = south; j <= north; j += 1) {
        if (squares.get(keyOf(i, j))?.some((point) => distance(point, at) < gap) === true)
          return false;
      }
    }
    return true;
  }
  return { add: addLine, isClear };
}
