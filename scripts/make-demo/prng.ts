/** A stream of reproducible numbers; `fork` gives an independent stream for a named part. */
export type Random = {
  readonly next: () => number;
  readonly range: (low: number, high: number) => number;
  readonly whole: (low: number, high: number) => number;
  readonly chance: (probability: number) => boolean;
  readonly pick: <T>(choices: readonly T[]) => T;
  readonly weighted: <T>(choices: readonly (readonly [T, number])[]) => T;
  readonly fork: (label: string | number) => Random;
};

function hashText(text: string, seed: number): number {
  let hash = (0x811c9dc5 ^ seed) >>> 0;
  for (let index = 0; index < text.length; index += 1) {
    hash = Math.imul(hash ^ text.charCodeAt(index), 0x01000193) >>> 0;
  }
  return mix(hash);
}

/** Spreads every bit of a whole number over all 32. */
export function mix(value: number): number {
  let bits = value >>> 0;
  bits = Math.imul(bits ^ (bits >>> 16), 0x85ebca6b) >>> 0;
  bits = Math.imul(bits ^ (bits >>> 13), 0xc2b2ae35) >>> 0;
  return (bits ^ (bits >>> 16)) >>> 0;
}

function first<T>(choices: readonly T[]): T {
  const [choice] = choices;
  if (choice === undefined) throw new Error('Nothing to choose from.');
  return choice;
}

function pickWeighted<T>(choices: readonly (readonly [T, number])[], share: number): T {
  const total = choices.reduce((sum, [, weight]) => sum + weight, 0);
  let left = share * total;
  for (const [choice, weight] of choices) {
    left -= weight;
    if (left < 0) return choice;
  }
  return first(choices)[0];
}

/** The mulberry32 generator: small, quick, and the same in every engine. */
export function createRandom(seed: number): Random {
  let state = seed >>> 0;
  function next(): number {
    state = (state + 0x6d2b79f5) >>> 0;
    let bits = Math.imul(state ^ (state >>> 15), state | 1);
    bits ^= bits + Math.imul(bits ^ (bits >>> 7), bits | 61);
    return ((bits ^ (bits >>> 14)) >>> 0) / 4294967296;
  }
  return {
    next,
    range: (low, high) => low + next() * (high - low),
    whole: (low, high) => low + Math.floor(next() * (high - low + 1)),
    chance: (probability) => next() < probability,
    pick: (choices) => choices[Math.floor(next() * choices.length)] ?? first(choices),
    weighted: (choices) => pickWeighted(choices, next()),
    fork: (label) => createRandom(hashText(String(label), seed)),
  };
}
