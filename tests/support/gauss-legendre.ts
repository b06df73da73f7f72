/** Nodes in (−1, 1) and weights of the n-point rule of Gauss and Legendre, which is exact to degree 2n − 1. */
function rule(n: number): { node: number; weight: number }[] {
  return Array.from({ length: n }, (_, k) => {
    let node = Math.cos((Math.PI * (k + 0.75)) / (n + 0.5));
    let slope = 1;
    // Newton's steps double their digits: from a start good to 1e-3, six are plenty
    for (let step = 0; step < 6; step++) {
      let [before, value] = [1, node];
      for (let m = 2; m <= n; m++) {
        [before, value] = [value, ((2 * m - 1) * node * value - (m - 1) * before) / m];
      }
      slope = (n * (node * value - before)) / (node * node - 1);
      node -= value / slope;
    }
    return { node, weight: 2 / ((1 - node * node) * slope * slope) };
  });
}

const FIVE = rule(5);

/** Points and weights by which to integrate from `from` to `to` in equal panels no longer than `panel`. */
export function quadraturePoints(
  from: number,
  to: number,
  panel: number,
): { s: number; weight: number }[] {
  const panels = Math.max(1, Math.ceil((to - from) / panel));
  const half = (to - from) / panels / 2;
  return Array.from({ length: panels }, (_, k) => from + (2 * k + 1) * half).flatMap((middle) =>
    FIVE.map(({ node, weight }) => ({ s: middle + half * node, weight: half * weight })),
  );
}

/** ∫ f from `from` to `to`. */
export function integral(
  f: (s: number) => number,
  from: number,
  to: number,
  panel: number,
): number {
  return quadraturePoints(from, to, panel).reduce((sum, { s, weight }) => sum + weight * f(s), 0);
}
