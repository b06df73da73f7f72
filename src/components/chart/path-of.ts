/** A place on a drawing, in pixels. */
export type Place = readonly [x: number, y: number];

function written([x, y]: Place): string {
  return `${x.toFixed(1)} ${y.toFixed(1)}`;
}

/** The path through places in order; empty without any. */
export function pathOf(places: readonly Place[]): string {
  return places.length === 0 ? '' : `M${places.map(written).join('L')}`;
}

/** The closed path between two lines that run the same way. */
export function pathBetween(one: readonly Place[], other: readonly Place[]): string {
  const path = pathOf([...one, ...[...other].reverse()]);
  return path === '' ? '' : `${path}Z`;
}
