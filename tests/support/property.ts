import fc from 'fast-check';

const SEED = 20261201;

/** Checks a property on 200 drawn cases, the same ones in every run. */
export function holds<Case>(
  drawn: fc.Arbitrary<Case>,
  property: (drawn: Case) => void,
  cases = 200,
): void {
  fc.assert(fc.property(drawn, property), { seed: SEED, numRuns: cases });
}

/** Fine enough to look continuous, and exact in a double. */
const STEPS = 2 ** 40;

/**
 * A number between two others, spread evenly, the ends more often. (`fc.double` spreads evenly over bit
 * patterns, so that nearly all of its numbers are nearly 0.)
 */
export function numbers(min: number, max: number): fc.Arbitrary<number> {
  return fc.integer({ min: 0, max: STEPS }).map((step) => min + (step / STEPS) * (max - min));
}
