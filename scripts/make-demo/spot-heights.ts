import { origin } from './features.ts';
import { levelAt } from './ground.ts';
import { boundsOf } from './polygons.ts';
import { createRandom } from './prng.ts';
import type { Town } from './town.ts';
import type { Point } from './vector.ts';

const rowLimit = 40_000;

/** Spot heights: along the streets, along the quay edge and over the open ground. */
export function spotHeights(town: Town, seed: number): string {
  const { terrain, streets } = town;
  const random = createRandom(seed).fork('levels');
  const [west, south, east, north] = boundsOf(terrain.water.coast);
  const spacing = Math.max(20, Math.sqrt(((east - west) * (north - south)) / rowLimit));
  const spots: Point[] = streets.flatMap(({ line }) => line.filter((_, index) => index % 2 === 0));
  for (let x = west; x < east; x += spacing) {
    for (let y = south; y < north; y += spacing) {
      spots.push([x + random.range(0, spacing / 2), y + random.range(0, spacing / 2)]);
    }
  }
  const rows = spots
    .filter((at) => terrain.toShore(at) > 2 && terrain.toQuay(at) > 0.5)
    .map((at) => {
      const [easting, northing] = [at[0] + origin[0], at[1] + origin[1]];
      return `${easting.toFixed(2)},${northing.toFixed(2)},${levelAt(at, terrain, seed).toFixed(2)}`;
    });
  return `E,N,level\n${rows.join('\n')}\n`;
}
