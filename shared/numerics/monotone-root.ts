import { at } from './at.ts';

const MOST_STEPS = 80;
const CLOSE_ENOUGH = 1e-15;

/**
 * The t at which a polynomial passes a level between two arguments on whose two sides of it it lies,
 * by Newton's steps kept inside the bracket.
 *
 * Units: t. Valid: the polynomial is monotone from `from` to `to` and passes the level there; error
 * under 1e-14. Source: [own], Newton's method.
 */
export function monotoneRoot(
  c: Float64Array,
  offset: number,
  degree: number,
  level: number,
  from: number,
  to: number,
): number {
  let a = from;
  let b = to;
  let valueAtEnd = at(c, offset + degree);
  for (let k = degree - 1; k >= 0; k--) valueAtEnd = valueAtEnd * to + at(c, offset + k);
  const rising = valueAtEnd > level;
  let t = (a + b) / 2;
  for (let step = 0; step < MOST_STEPS; step++) {
    let value = at(c, offset + degree);
    let slope = 0;
    for (let k = degree - 1; k >= 0; k--) {
      slope = slope * t + value;
      value = value * t + at(c, offset + k);
    }
    if (value === level) return t;
    if (value > level === rising) b = t;
    else a = t;
    const newton = t - (value - level) / slope;
    const next = newton > a && newton < b ? newton : (a + b) / 2;
    if (Math.abs(next - t) < CLOSE_ENOUGH || b - a < CLOSE_ENOUGH) return next;
    t = next;
  }
  return t;
}
