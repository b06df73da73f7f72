/** Numbers from 0 to 1 that are the same on every machine (a linear congruential generator). */
export function seededRandom(seed: number): () => number {
  let state = seed;
  return () => {
    state = (Math.imul(state, 1103515245) + 12345) & 0x7fffffff;
    return state / 0x80000000;
  };
}
