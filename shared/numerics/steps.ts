/**
 * The multiples of a step between two values, either way round; the ends count.
 *
 * Units: those of the values. Valid: step > 0. Source: [own].
 */
export function steps(from: number, to: number, step: number): number[] {
  const [low, high] = [Math.min(from, to), Math.max(from, to)];
  // a value that rounding moves a hair past an end counts
  const slack = 1e-9 * step;
  const first = Math.ceil((low - slack) / step);
  const count = Math.max(0, Math.floor((high + slack) / step) - first + 1);
  return high - low < slack ? [] : Array.from({ length: count }, (_, k) => (first + k) * step);
}
