import type { LonLatBounds } from '../../../../shared/schemas/basemap.ts';
import type { OwnBuilding } from '../../../../shared/schemas/own.ts';

type Size = { readonly width: number; readonly height: number };

const METRES_A_DEGREE = 111_320;
/** The scale of a town plan, which a large building or a tunnel farther off makes smaller. */
const PIXELS_PER_METRE = 2.6;
/** Ground that is shown round the building, and beyond the tunnel, in metres. */
const [ROUND, BEYOND] = [25, 15];

function middleAndHalf(values: readonly number[]): [middle: number, half: number] {
  const [least, most] = [Math.min(...values), Math.max(...values)];
  return [(least + most) / 2, (most - least) / 2];
}

/** The piece of the map that shows a building and, where it is near, the tunnel beside it. */
export function boundsRound(
  { outline, figures }: Pick<OwnBuilding, 'outline' | 'figures'>,
  { width, height }: Size,
): LonLatBounds {
  const corners = outline.flat(2);
  const [longitude, halfWidth] = middleAndHalf(corners.map(([x]) => x));
  const [latitude, halfHeight] = middleAndHalf(corners.map(([, y]) => y));
  const eastMetres = METRES_A_DEGREE * Math.cos((latitude * Math.PI) / 180);
  const [across, along] = [halfWidth * eastMetres, halfHeight * METRES_A_DEGREE];
  const toTunnel = figures === null ? 0 : figures.distance + figures.diameter + BEYOND;
  const metresPerPixel = Math.max(
    1 / PIXELS_PER_METRE,
    (across + ROUND) / (width / 2),
    (along + Math.max(ROUND, toTunnel)) / (height / 2),
  );
  const [east, north] = [(metresPerPixel * width) / 2, (metresPerPixel * height) / 2];
  return [
    longitude - east / eastMetres,
    latitude - north / METRES_A_DEGREE,
    longitude + east / eastMetres,
    latitude + north / METRES_A_DEGREE,
  ];
}
