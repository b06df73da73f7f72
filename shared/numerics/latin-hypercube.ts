import { at } from './at.ts';

/** 0 to n − 1 in an order drawn by lot. */
function shuffled(n: number, share: () => number): Float64Array {
  const order = Float64Array.from({ length: n }, (_, k) => k);
  for (let k = n - 1; k > 0; k--) {
    const other = Math.floor(share() * (k + 1));
    const moved = at(order, other);
    order[other] = at(order, k);
    order[k] = moved;
  }
  return order;
}

/**
 * A Latin hypercube: for each input n shares between 0 and 1, one in each of n parts of equal width, in
 * an order of its own. `hypercube[d][k]` is what sample k takes of input d.
 *
 * Units: none. Valid: n ≥ 1; `share` gives numbers between 0 and 1, as `randomShares`.
 * Source: mckay-beckman-conover-1979.
 */
export function latinHypercube(n: number, inputs: number, share: () => number): Float64Array[] {
  return Array.from({ length: inputs }, () =>
    shuffled(n, share).map((part) => (part + share()) / n),
  );
}
