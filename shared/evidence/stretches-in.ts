import type { Rectangle, Spot } from './marks.ts';

/** The part of a straight line inside a rectangle, as shares of its length; undefined where none is. */
function sharesIn([x0, y0]: Spot, [x1, y1]: Spot, window: Rectangle): [number, number] | undefined {
  let [from, to] = [0, 1];
  const sides = [
    [x0, x1 - x0, window.left, window.right],
    [y0, y1 - y0, window.top, window.bottom],
  ] as const;
  for (const [start, rate, low, high] of sides) {
    if (rate === 0) {
      if (start < low || start > high) return undefined;
      continue;
    }
    const ends = [(low - start) / rate, (high - start) / rate];
    from = Math.max(from, Math.min(...ends));
    to = Math.min(to, Math.max(...ends));
  }
  return from < to ? [from, to] : undefined;
}

/**
 * The stretches of a line inside a rectangle, cut at its sides.
 *
 * Units: mm. Valid: none where the line keeps outside. Source: [own].
 */
export function stretchesIn(window: Rectangle, line: readonly Spot[]): Spot[][] {
  const found: Spot[][] = [];
  let isOpen = false;
  for (const [k, end] of line.entries()) {
    const start = line[k - 1];
    if (start === undefined) continue;
    const shares = sharesIn(start, end, window);
    if (shares === undefined) {
      isOpen = false;
      continue;
    }
    const at = (share: number): Spot => [
      start[0] + share * (end[0] - start[0]),
      start[1] + share * (end[1] - start[1]),
    ];
    if (!isOpen || shares[0] > 0) found.push([at(shares[0])]);
    found.at(-1)?.push(at(shares[1]));
    isOpen = shares[1] === 1;
  }
  return found;
}
