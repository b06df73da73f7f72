import { offset, outers } from './clip.ts';
import { resample, spline } from './lines.ts';
import { distanceToRing, inside } from './polygons.ts';
import { step } from './streamlines.ts';
import { boxed, isNear } from './terrain.ts';
import { cyclic, distance, itemAt } from './vector.ts';
import type { Line, Point, Ring } from './vector.ts';
import type { Site } from './sites.ts';
import type { Water } from './water.ts';

export type StreetClass = 'main' | 'quay' | 'street' | 'lane' | 'square' | 'bridge' | 'track';

/** A street before it is cut into named lengths. */
export type RawStreet = {
  readonly line: Line;
  readonly width: number;
  readonly class: StreetClass;
  readonly name: string | null;
  /** Laid by hand: never thinned out or pruned. */
  readonly fixed: boolean;
};

type Laid = readonly [name: string, width: number, kind: StreetClass, points: Line];

const laid: readonly Laid[] = [
  ['Saltgate', 8, 'main', [[485, 353], [520, 374], [560, 384], [604, 402], [650, 408], [700, 424], [752, 436]]],
  ['Beacon Road', 9, 'main', [[890, 468], [930, 482], [984, 478], [1040, 492], [1084, 486], [1122, 500]]],
  ['Northgate', 8.5, 'main', [[404, 442], [410, 486], [428, 540], [414, 604], [426, 668], [456, 724], [448, 780], [462, 836]]],
  ['Mast Street', 8, 'main', [[790, 470], [792, 520], [812, 566], [829, 612]]],
  ['Cooper Street', 8, 'main', [[828, 430], [822, 374], [838, 318], [856, 252], [842, 190], [856, 120], [884, 60], [888, 20]]],
  ['Bridge Street', 8, 'main', [[60, 122], [120, 108], [186, 86], [250, 78], [290, 78]]],
  ['Mole Street', 8, 'main', [[332, 78], [384, 92], [440, 116], [500, 120], [548, 106], [604, 84], [680, 74], [748, 40], [786, 0]]],
  ['West Gate', 8.5, 'main', [[258, 312], [206, 342], [140, 348], [70, 364], [6, 356], [-50, 372], [-102, 360]]],
  ['Sluice Street', 7, 'main', [[115, 500], [170, 528], [232, 540], [300, 544], [352, 562], [420, 566]]],
  ['Ferry Street', 7, 'main', [[472, 290], [500, 288], [530, 284], [580, 296], [634, 288], [690, 300], [756, 300], [836, 312]]],
]; // prettier-ignore

/** The bascule bridge over the harbour's throat. */
const bascule: Laid = ['Bascule Bridge', 8, 'bridge', [[284, 78], [334, 78]]]; // prettier-ignore

/** Ends a road at the edge of the beach. */
function ashore(line: Line, water: Water): Line {
  const dry = (point: Point): boolean =>
    inside(point, water.coast) && distanceToRing(point, water.coast) > 30;
  const first = line.findIndex(dry);
  const last = line.findLastIndex(dry);
  return line.slice(first, last + 1);
}

function fixedStreet([name, width, kind, points]: Laid, water: Water): RawStreet {
  return {
    line: ashore(resample(spline(points, 12), step), water),
    width,
    class: kind,
    name,
    fixed: true,
  };
}

function closed(ring: Ring): Line {
  return resample([...ring, itemAt(ring, 0)], step);
}

/** Opens a closed line at its only long gap. */
function openAtGap(ring: Ring): Line {
  const start = ring.findIndex(
    (point, index) => distance(point, cyclic(ring, index + 1)) > 4 * step,
  );
  return [...ring.slice(start + 1), ...ring.slice(0, start + 1)];
}

function quayStreet(water: Water): RawStreet {
  const ring = cyclic(outers(offset([water.quayLine], 12.5, 'round')), 0);
  const dry = closed(ring)
    .slice(0, -1)
    .filter(([, y]) => y > -24);
  return { line: openAtGap(dry), width: 7, class: 'quay', name: null, fixed: true };
}

/** A road behind the beach; it is thinned out like any other street. */
function shoreStreet(water: Water): RawStreet {
  const ring = cyclic(outers(offset([water.coast], -38, 'round')), 0);
  const dry = closed(ring)
    .slice(0, -1)
    .filter((point) => !isNear(point, boxed(water.quayLine), 40));
  return { line: openAtGap(dry), width: 6, class: 'street', name: null, fixed: false };
}

function siteStreet(site: Site): RawStreet[] {
  if (site.edge === 0) return [];
  const inner = site.kind === 'square' ? -site.edge / 2 : site.edge / 2 + 0.5;
  const ring = outers(offset([site.ring], inner, 'round'))[0] ?? site.ring;
  const kind = site.kind === 'square' ? 'square' : 'street';
  return [{ line: closed(ring), width: site.edge, class: kind, name: site.edgeName, fixed: true }];
}

/** The streets that were there first: quays, gates, bridges and the edges of open places. */
export function mainStreets(water: Water, sites: readonly Site[]): RawStreet[] {
  return [
    quayStreet(water),
    shoreStreet(water),
    ...[...laid, bascule].map((street) => fixedStreet(street, water)),
    ...sites.flatMap(siteStreet),
  ];
}
