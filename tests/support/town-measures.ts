import { common } from '../../scripts/make-demo/clip.ts';
import { chainages } from '../../scripts/make-demo/lines.ts';
import { inside, nearestOn, signedArea } from '../../scripts/make-demo/polygons.ts';
import type { Town } from '../../scripts/make-demo/town.ts';
import { cyclic, distance, itemAt } from '../../scripts/make-demo/vector.ts';
import type { Line, Point, Ring } from '../../scripts/make-demo/vector.ts';
import { townFiles } from '../../scripts/make-demo/write.ts';

type BuildingProperties = Record<string, string | number | null>;
type Building = {
  properties: BuildingProperties;
  geometry: { type: string; coordinates: Point[][] };
};

export function buildingsOf(town: Town, seed: number): { crs: unknown; features: Building[] } {
  const text = townFiles(town, seed).get('buildings.geojson')?.() ?? '';
  return JSON.parse(text) as { crs: unknown; features: Building[] };
}

export function wallKeys(ring: Ring): string[] {
  return ring.map((a, index) => [a.join(), cyclic(ring, index + 1).join()].sort().join(' '));
}

/** The longest stretch of a line that keeps within half a metre of straight. */
export function longestStraight(line: Line): number {
  const stations = chainages(line);
  let longest = 0;
  for (let from = 0; from < line.length; from += 1) {
    for (let to = from + 1; to < line.length; to += 1) {
      const [a, b] = [itemAt(line, from), itemAt(line, to)];
      if (line.slice(from, to).some((point) => distance(nearestOn(point, a, b), point) > 0.5))
        break;
      longest = Math.max(longest, itemAt(stations, to) - itemAt(stations, from));
    }
  }
  return longest;
}

/** Worked out by the clipper, not by the test the generator itself relies on. */
export function sharedArea(a: Ring, b: Ring): number {
  return common([a], [b]).reduce((sum, ring) => sum + signedArea(ring), 0);
}

export function touches(ring: Ring, line: Line, reach: number): boolean {
  const parts = line.slice(1).map((b, index) => [itemAt(line, index), b] as const);
  return parts.some(
    ([a, b]) =>
      ring.some((point) => distance(nearestOn(point, a, b), point) < reach) ||
      [a, b].some((point) => inside(point, ring)),
  );
}
