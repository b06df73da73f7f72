/** West, south, east, north in degrees; west is greater than east across the date line. */
type Bounds = readonly [west: number, south: number, east: number, north: number];

/** Whether a place in degrees lies within bounds or so many degrees beside them. */
export function withinBounds(
  [west, south, east, north]: Bounds,
  [longitude, latitude]: readonly [number, number],
  margin: number,
): boolean {
  if (!(latitude >= south - margin && latitude <= north + margin)) return false;
  const isAfter = longitude >= west - margin;
  const isBefore = longitude <= east + margin;
  return west > east ? isAfter || isBefore : isAfter && isBefore;
}
