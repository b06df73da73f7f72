import { footprint } from './footprints.ts';
import type { Footprint, Kind } from './footprints.ts';
import { frameOf } from './frames.ts';
import { tidy } from './ground-plan.ts';
import { centroid } from './polygons.ts';
import type { Site } from './sites.ts';
import { churchShape, customsShape, slab, youShape } from './templates.ts';
import { along, cyclic, distance, left, place, scale, subtract, unit } from './vector.ts';
import type { Point, Ring } from './vector.ts';
import type { Water } from './water.ts';

function onSite(
  site: Site,
  shape: Ring,
  kind: Kind,
  name: string,
  shift: Point = [0, 0],
): Footprint {
  const { centre, axis } = frameOf(site.ring);
  const east = axis[0] < 0 ? scale(axis, -1) : axis;
  const ring = tidy(place(shape, along(along(centre, east, shift[0]), left(east), shift[1]), east));
  return footprint(ring, kind, nearestEdge(centroid(ring), site.ring), { name });
}

/** The middle of the nearest side of a site: where its address is read. */
export function nearestEdge(from: Point, ring: Ring): Point {
  const middles = ring.map((a, index): Point => {
    const b = cyclic(ring, index + 1);
    return [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2];
  });
  return middles.reduce((best, point) =>
    distance(point, from) < distance(best, from) ? point : best,
  );
}

/** What stands on the sites that were kept clear for it. */
export function buildOnSites(sites: readonly Site[]): Footprint[] {
  return sites.flatMap((site): Footprint[] => {
    if (site.name === 'St Elwin’s churchyard')
      return [onSite(site, churchShape(), 'church', 'Church of St Elwin')];
    if (site.name === 'Customs Quay')
      return [onSite(site, customsShape(), 'customs house', 'Customs House', [7, 2])];
    if (site.name === 'School ground') {
      return [
        onSite(site, youShape(58, 34, 10.5), 'school', 'Port Dogger School', [-4, -5]),
        onSite(site, slab(11, 8), 'outbuilding', 'School kitchen', [33, 14]),
      ];
    }
    if (site.name === 'Fish quay')
      return [onSite(site, slab(76, 29), 'fish market', 'Fish Market')];
    if (site.name === 'Ropewalk ground')
      return [onSite(site, slab(126, 7.5), 'ropewalk', 'The Long Ropewalk')];
    if (site.name === 'Almoner’s green')
      return [onSite(site, youShape(46, 30, 6.6), 'almshouses', 'Mariners’ Almshouses', [0, -2])];
    return [];
  });
}

/** The keeper's house stands on the narrow quay beside the bascule bridge. */
export function buildKeepersHouse(water: Water): Footprint {
  const edge = water.quayLine.reduce((best, point) =>
    distance(point, [336, 64]) < distance(best, [336, 64]) ? point : best,
  );
  const away = unit(subtract([390, 64], edge));
  const centre = along(edge, away, 4.6);
  const ring: Ring = [[-3.6, -2.8], [2.2, -2.8], [2.2, -1.6], [3.6, -1.6], [3.6, 2.8], [-3.6, 2.8]]; // prettier-ignore
  return footprint(tidy(place(ring, centre, left(away))), 'bridge keeper’s house', [346, 76], {
    name: 'Bridge keeper’s house',
  });
}
