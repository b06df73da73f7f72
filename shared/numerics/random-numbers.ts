const MULTIPLIER = 6364136223846793005n;
/** Which of the generator's sequences is taken; any odd number would do. */
const INCREMENT = 109n;
const RANGE = 4294967296;

/**
 * The largest seed of `randomNumbers`.
 *
 * Units: none. Valid: a constant. Source: [own].
 */
export const LARGEST_SEED = RANGE - 1;

/**
 * Numbers from 0 to 4294967295 as if drawn by lot: the permuted congruential generator PCG32, so that a
 * seed gives the same numbers on every machine.
 *
 * Units: none. Valid: seed a whole number from 0 to LARGEST_SEED. Source: oneill-2014.
 */
export function randomNumbers(seed: number): () => number {
  const step = (state: bigint) => BigInt.asUintN(64, state * MULTIPLIER + INCREMENT);
  let state = step(BigInt.asUintN(64, step(0n) + BigInt(seed)));
  return () => {
    const word = Number(BigInt.asUintN(32, ((state >> 18n) ^ state) >> 27n));
    const turn = Number(state >> 59n);
    state = step(state);
    return ((word >>> turn) | (word << (-turn & 31))) >>> 0;
  };
}

/**
 * The same as shares between 0 and 1, neither of which comes out.
 *
 * Units: none. Valid: as `randomNumbers`. Source: oneill-2014.
 */
export function randomShares(seed: number): () => number {
  const next = randomNumbers(seed);
  return () => (next() + 0.5) / RANGE;
}
