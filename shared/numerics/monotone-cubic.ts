import { MethodError } from '../method-error.ts';
import { at } from './at.ts';
import { intervalIndex } from './interval-index.ts';

/**
 * A piecewise cubic through a table that never overshoots its rows.
 *
 * Units: those of the table. Valid: made by `monotoneCubic`. Source: fritsch-carlson-1980.
 */
export type MonotoneCubic = {
  readonly arguments: Float64Array;
  readonly values: Float64Array;
  readonly slopes: Float64Array;
};

function slopeAtEnd(secant: number, width: number, next: number, nextWidth: number): number {
  const slope = ((2 * width + nextWidth) * secant - width * next) / (width + nextWidth);
  if (slope * secant <= 0) return 0;
  return secant * next < 0 && Math.abs(slope) > 3 * Math.abs(secant) ? 3 * secant : slope;
}

/**
 * The monotone cubic through rows of (argument, value). With `flatEnd` it meets the last row with
 * zero slope, as a ground movement that dies out must.
 *
 * Units: those of the rows. Valid: at least two rows, arguments growing, else throws `bad-table`.
 * Source: fritsch-carlson-1980; slopes between rows by the weighted harmonic mean, which stays in
 * their region of monotonicity [own].
 */
export function monotoneCubic(
  rows: readonly (readonly [number, number])[],
  flatEnd = false,
): MonotoneCubic {
  const x = Float64Array.from(rows, (row) => row[0]);
  const y = Float64Array.from(rows, (row) => row[1]);
  const last = rows.length - 1;
  if (last < 1) throw new MethodError('bad-table', 'A table needs at least two rows.');
  const width = Float64Array.from({ length: last }, (_, k) => at(x, k + 1) - at(x, k));
  if (!width.every((w) => w > 0)) {
    throw new MethodError('bad-table', 'The arguments of a table must grow from row to row.');
  }
  const secant = Float64Array.from(width, (w, k) => (at(y, k + 1) - at(y, k)) / w);
  const slopes = new Float64Array(rows.length);
  for (let k = 1; k < last; k++) {
    const [before, after] = [at(secant, k - 1), at(secant, k)];
    if (before * after <= 0) continue;
    const [w1, w2] = [2 * at(width, k) + at(width, k - 1), at(width, k) + 2 * at(width, k - 1)];
    slopes[k] = (w1 + w2) / (w1 / before + w2 / after);
  }
  if (last === 1) {
    slopes.fill(at(secant, 0));
  } else {
    slopes[0] = slopeAtEnd(at(secant, 0), at(width, 0), at(secant, 1), at(width, 1));
    const [near, far] = [last - 1, last - 2];
    slopes[last] = slopeAtEnd(at(secant, near), at(width, near), at(secant, far), at(width, far));
  }
  if (flatEnd) slopes[last] = 0;
  return { arguments: x, values: y, slopes };
}

/**
 * Value, slope and curvature of a monotone cubic; beyond its rows the value of the nearest row, level.
 * On a row the slope and curvature are those of the interval after it, on the last row before it.
 *
 * Units: those of the table. Valid: any finite x. Source: fritsch-carlson-1980.
 */
export function evaluateMonotoneCubic(
  cubic: MonotoneCubic,
  x: number,
): { value: number; slope: number; curvature: number } {
  const xs = cubic.arguments;
  const last = xs.length - 1;
  if (x < at(xs, 0)) return { value: at(cubic.values, 0), slope: 0, curvature: 0 };
  if (x > at(xs, last)) return { value: at(cubic.values, last), slope: 0, curvature: 0 };
  const k = intervalIndex(xs, x);
  const width = at(xs, k + 1) - at(xs, k);
  const t = (x - at(xs, k)) / width;
  const rise = at(cubic.values, k + 1) - at(cubic.values, k);
  const [m0, m1] = [at(cubic.slopes, k) * width, at(cubic.slopes, k + 1) * width];
  const [c2, c3] = [3 * rise - 2 * m0 - m1, m0 + m1 - 2 * rise];
  return {
    value: at(cubic.values, k) + t * (m0 + t * (c2 + t * c3)),
    slope: (m0 + t * (2 * c2 + t * 3 * c3)) / width,
    curvature: (2 * c2 + 6 * c3 * t) / (width * width),
  };
}
