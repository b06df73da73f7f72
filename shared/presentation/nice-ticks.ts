import { decade } from '../numerics/decade.ts';

const STEPS = [1, 2, 5, 10];

/** The smallest of 1, 2 and 5 times a power of ten that is not under a step. */
function niceStep(step: number): number {
  const { power } = decade(step);
  // a step that rounding lifts a hair over a nice one is that one
  const share = step / power - 1e-9;
  return (STEPS.find((nice) => nice >= share) ?? 10) * power;
}

/**
 * Round values within a span, some `count` of them, for the ticks of an axis.
 *
 * Units: those of the span. Valid: none where the span has no length. Source: [own].
 */
export function niceTicks(from: number, to: number, count: number): readonly number[] {
  if (!(to > from) || count < 1) return [];
  const step = niceStep((to - from) / count);
  const digits = Math.max(0, -decade(step).exponent);
  const [first, last] = [Math.ceil(from / step - 1e-9), Math.floor(to / step + 1e-9)];
  return Array.from({ length: last - first + 1 }, (_, k) =>
    // the text cuts off what multiplying adds: 0.1 × 3; adding 0 makes a plain zero of −0
    Number(((first + k) * step + 0).toFixed(digits)),
  );
}
