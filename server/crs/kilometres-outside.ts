/** West, south, east, north in degrees; west is greater than east across the date line. */
type Bounds = readonly [west: number, south: number, east: number, north: number];

/** A degree of latitude on a globe of 6371 km. */
const KILOMETRES_A_DEGREE = 111.2;

/** How far apart two stretches of a scale are; 0 where they meet. */
function gap([from, to]: readonly [number, number], [least, most]: readonly [number, number]) {
  return Math.max(0, least - to, from - most);
}

/** How far a box lies outside of where a system is used, in kilometres and roughly; 0 where they meet. */
export function kilometresOutside(
  box: {
    readonly west: number;
    readonly south: number;
    readonly east: number;
    readonly north: number;
  },
  [west, south, east, north]: Bounds,
): number {
  const upwards = gap([box.south, box.north], [south, north]);
  const end = west > east ? east + 360 : east;
  const sideways = Math.min(
    ...[-360, 0, 360].map((turn) => gap([box.west + turn, box.east + turn], [west, end])),
  );
  const nearest = Math.max(-90, Math.min(90, (box.south + box.north) / 2));
  const narrowing = Math.cos((nearest * Math.PI) / 180);
  return Math.hypot(upwards, sideways * narrowing) * KILOMETRES_A_DEGREE;
}
