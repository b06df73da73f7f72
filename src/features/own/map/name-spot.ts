type Pixel = readonly [x: number, y: number];

type Size = { readonly width: number; readonly height: number };

export type Spot = { readonly x: number; readonly y: number; readonly degrees: number };

const STEPS = 20;
/** From the edges, across and along. */
const [SIDE, TOP] = [60, 16];
/** What the label of the building takes. */
const CLEAR = 85;

function spotsOf([x1, y1]: Pixel, [x2, y2]: Pixel): Spot[] {
  const turned = (Math.atan2(y2 - y1, x2 - x1) * 180) / Math.PI;
  // upside down it could not be read
  const degrees = turned > 90 ? turned - 180 : turned < -90 ? turned + 180 : turned;
  return Array.from({ length: STEPS + 1 }, (_, k) => {
    const share = k / STEPS;
    return { x: x1 + share * (x2 - x1), y: y1 + share * (y2 - y1), degrees };
  });
}

/** Where the name of a line stands: on it, well inside of the map and clear of the building, as far left as that goes; null where nothing is left. */
export function nameSpot(
  lines: readonly (readonly Pixel[])[],
  middle: Pixel,
  size: Size,
): Spot | null {
  const spots = lines.flatMap((line) =>
    line.slice(1).flatMap((end, k) => {
      const start = line[k];
      return start === undefined ? [] : spotsOf(start, end);
    }),
  );
  const fits = spots.filter(
    ({ x, y }) =>
      x > SIDE &&
      x < size.width - SIDE &&
      y > TOP &&
      y < size.height - TOP - 20 &&
      Math.hypot(x - middle[0], y - middle[1]) > CLEAR,
  );
  const [first, ...others] = fits;
  if (first === undefined) return null;
  return others.reduce((best, one) => (one.x < best.x ? one : best), first);
}
