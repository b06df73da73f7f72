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

/** A finite number between two others. */
export function numbers(min: number, max: number): fc.Arbitrary<number> {
  return fc.double({ min, max, noNaN: true, noDefaultInfinity: true });
}
