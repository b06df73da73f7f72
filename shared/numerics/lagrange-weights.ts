/**
 * What the values at given places are multiplied by and summed to give that of the polynomial through
 * them at x.
 *
 * Units: none. Valid: places differ; one place stands for every x. Source: [own], Lagrange interpolation.
 */
export function lagrangeWeights(places: readonly number[], x: number): number[] {
  return places.map((own) =>
    places.reduce(
      (weight, other) => (other === own ? weight : (weight * (x - other)) / (own - other)),
      1,
    ),
  );
}
