import { frameOf, fullness } from './frames.ts';
import { centroid, signedArea } from './polygons.ts';
import { createRandom, mix } from './prng.ts';
import type { Random } from './prng.ts';
import { atChainage } from './sites.ts';
import type { Terrain } from './terrain.ts';
import { distance } from './vector.ts';
import type { Point, Ring } from './vector.ts';

export type BlockStyle =
  'old' | 'terrace' | 'villas' | 'stores' | 'court' | 'office' | 'flats' | 'works' | 'green';
type Weights = readonly (readonly [BlockStyle, number])[];

const quarters = {
  docks: [
    ['stores', 0.55],
    ['works', 0.2],
    ['old', 0.25],
  ],
  quays: [
    ['stores', 0.4],
    ['old', 0.54],
    ['court', 0.06],
  ],
  market: [
    ['old', 0.46],
    ['court', 0.24],
    ['office', 0.3],
  ],
  old: [
    ['old', 0.8],
    ['court', 0.11],
    ['works', 0.09],
  ],
  inner: [
    ['terrace', 0.42],
    ['court', 0.15],
    ['flats', 0.13],
    ['office', 0.08],
    ['villas', 0.11],
    ['works', 0.11],
  ],
  west: [
    ['terrace', 0.36],
    ['works', 0.3],
    ['flats', 0.2],
    ['villas', 0.14],
  ],
  hill: [
    ['villas', 0.62],
    ['terrace', 0.26],
    ['flats', 0.12],
  ],
  edge: [
    ['terrace', 0.18],
    ['villas', 0.5],
    ['flats', 0.14],
    ['green', 0.18],
  ],
  works: [
    ['works', 0.6],
    ['stores', 0.15],
    ['terrace', 0.25],
  ],
  estate: [
    ['flats', 0.45],
    ['terrace', 0.4],
    ['green', 0.15],
  ],
  centre: [
    ['court', 0.3],
    ['office', 0.25],
    ['old', 0.45],
  ],
} satisfies Record<string, Weights>;

const hill: Point = [920, 665];
const repeat = 480;

/** Beyond the first town its quarters come again, one to a square of the map. */
function repeatedQuarter(at: Point): Weights {
  const [i, j] = [Math.floor(at[0] / repeat), Math.floor(at[1] / repeat)];
  const random = createRandom(mix(Math.imul(i, 83492791) ^ Math.imul(j, 19349663)));
  return random.weighted<Weights>([
    [quarters.inner, 0.42], [quarters.edge, 0.24], [quarters.hill, 0.1], [quarters.works, 0.08], [quarters.estate, 0.08], [quarters.centre, 0.08],
  ]); // prettier-ignore
}

function quarterOf(at: Point, terrain: Terrain): Weights {
  const age = terrain.age(at);
  const quay = terrain.toQuay(at);
  if (quay < 62) return at[0] < 330 || at[1] < 150 ? quarters.docks : quarters.quays;
  if (distance(at, atChainage(2966, 0)) < 125) return quarters.market;
  if (age < 0.78) return quarters.old;
  if (distance(at, hill) < 190) return quarters.hill;
  if (age > 2.3) return repeatedQuarter(at);
  if (terrain.toShore(at) < 110) return quarters.edge;
  return at[0] < 220 ? quarters.west : quarters.inner;
}

const leastArea: Record<BlockStyle, number> = {
  old: 0, terrace: 600, villas: 1400, stores: 700, court: 900, office: 520, flats: 1700, works: 1300, green: 0,
}; // prettier-ignore

/** Tall blocks and offices were only built where the ground is compact and not too large. */
export function suits(style: BlockStyle, area: number, compact: number): boolean {
  const isLarge = style === 'court' || style === 'office';
  if ((isLarge || style === 'works' || style === 'flats') && compact < 0.6) return false;
  return area >= leastArea[style] && !(isLarge && area > 4300);
}

/** Ground that lies mostly along the beach is left to the dunes. */
function isBeach(block: Ring, terrain: Terrain): boolean {
  const near = block.filter((point) => terrain.toShore(point) < 27).length;
  return near > 0.3 * block.length;
}

/** What was built in a block, by where it lies and how large it is. */
export function chooseStyle(block: Ring, terrain: Terrain, random: Random): BlockStyle {
  const at = centroid(block);
  const area = signedArea(block);
  if (area < 110 || frameOf(block).short < 6 || isBeach(block, terrain)) return 'green';
  const compact = fullness(block);
  const fitting = quarterOf(at, terrain).filter(([style]) => suits(style, area, compact));
  const [head] = fitting;
  return head === undefined ? 'old' : random.weighted(fitting);
}
