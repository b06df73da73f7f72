import type { BlockStyle } from './block-styles.ts';
import { cut, largest, offset } from './clip.ts';
import { footprint } from './footprints.ts';
import type { Footprint } from './footprints.ts';
import { frameOf, fullness } from './frames.ts';
import { makeGroundPlan, tidy } from './ground-plan.ts';
import type { GroundPlan } from './ground-plan.ts';
import { simplifyRing } from './lines.ts';
import { nearestOnRing, signedArea } from './polygons.ts';
import type { Random } from './prng.ts';
import { courtyardRow, villaRow, warehouseRow } from './large-row-styles.ts';
import { oldTownRow, terraceRow } from './row-styles.ts';
import type { StreetSense } from './row-styles.ts';
import { buildRow } from './rows.ts';
import type { RowStyle } from './rows.ts';
import { buildFlats, buildOffice, buildWorks } from './set-pieces.ts';
import { buildThrough } from './thin-blocks.ts';
import { itemAt } from './vector.ts';
import type { Line, Ring } from './vector.ts';
import { backRanges, buildYards, gardenWalls, privies, sheds } from './yards.ts';
import type { YardStyle } from './yards.ts';

/** All that stands in a block, and the garden walls between its plots. */
export type Filled = {
  readonly footprints: readonly Footprint[];
  readonly walls: readonly Line[];
  readonly style: BlockStyle;
};

type RowPart = {
  readonly style: RowStyle;
  readonly setback: number;
  readonly yard: YardStyle | null;
};

function inset(block: Ring, by: number): Ring | null {
  const ring = by === 0 ? block : largest(offset([block], -by, 'sharp'));
  if (ring === null) return null;
  const plain = simplifyRing(ring, 0.15);
  return plain.length > 2 ? plain : null;
}

function fillRow(ground: GroundPlan, part: RowPart, random: Random): Omit<Filled, 'style'> {
  const ring = inset(ground.block, part.setback);
  if (ring === null) return { footprints: [], walls: [] };
  const row = buildRow(ring, ground, part.style, random);
  const yards = part.yard === null ? [] : buildYards(row, ground, part.yard, random);
  return {
    footprints: [...row.map((built) => built.footprint), ...yards],
    walls: gardenWalls(row),
  };
}

/** One building round its own yard, where the block is compact enough for it. */
function ringBuilding(ground: GroundPlan, random: Random): Footprint[] {
  const outer = inset(ground.block, 0.6);
  if (outer === null || fullness(outer) < 0.72) return [];
  const shell = tidy(simplifyRing(outer, 0.8));
  const yard = largest(offset([shell], -random.range(10.5, 12.5), 'sharp'));
  if (
    yard === null ||
    signedArea(yard) < 90 ||
    frameOf(yard).short < 7.5 ||
    fullness(yard) < 0.6 ||
    !ground.fits(shell)
  )
    return [];
  const hole = tidy(simplifyRing(yard, 0.6));
  const rest = cut([shell], [hole]);
  if (rest.length !== 2) return [];
  ground.build(shell);
  const front = nearestOnRing(itemAt(shell, 0), ground.block).point;
  return [footprint(shell, 'courtyard block', front, { holes: [[...hole].reverse()] })];
}

function rowPart(style: BlockStyle, sense: StreetSense, random: Random): RowPart | null {
  if (style === 'old') return { style: oldTownRow(sense, random), setback: 0, yard: backRanges };
  if (style === 'terrace') {
    return {
      style: terraceRow(sense, random),
      setback: random.pick([0, 0.4, 1.8, 2.6]),
      yard: privies,
    };
  }
  if (style === 'villas')
    return { style: villaRow(random), setback: random.range(3.6, 6.4), yard: sheds };
  if (style === 'stores') return { style: warehouseRow(random), setback: 0, yard: null };
  return style === 'court' ? { style: courtyardRow(random), setback: 0.4, yard: null } : null;
}

function fillAs(ground: GroundPlan, style: BlockStyle, sense: StreetSense, random: Random): Filled {
  const { block } = ground;
  const { short } = frameOf(block);
  if (style !== 'green' && short < 15.5)
    return { footprints: buildThrough(ground, random), walls: [], style: 'old' };
  if (style === 'office') return { footprints: buildOffice(ground, random), walls: [], style };
  if (style === 'flats') return { footprints: buildFlats(ground, random), walls: [], style };
  if (style === 'works') return { footprints: buildWorks(ground, random), walls: [], style };
  if (style === 'court' && signedArea(block) < 3000 && short > 30 && random.chance(0.7)) {
    const one = ringBuilding(ground, random);
    if (one.length > 0) return { footprints: one, walls: [], style };
  }
  const part = rowPart(style, sense, random);
  return part === null
    ? { footprints: [], walls: [], style }
    : { ...fillRow(ground, part, random), style };
}

function coverOf({ footprints }: Filled, block: Ring): number {
  return footprints.reduce((sum, { ring }) => sum + signedArea(ring), 0) / signedArea(block);
}

/** Flats and villas stand in gardens; elsewhere so little building means that nothing fitted. */
function leastCover(style: BlockStyle): number {
  return style === 'flats' || style === 'villas' || style === 'works' ? 0.045 : 0.12;
}

/** Builds up one block in its style, or as the old town was where that leaves it all but empty. */
export function fillBlock(
  block: Ring,
  style: BlockStyle,
  sense: StreetSense,
  random: Random,
): Filled {
  const filled = fillAs(makeGroundPlan(block), style, sense, random);
  if (style === 'green' || coverOf(filled, block) > leastCover(style)) return filled;
  const again = fillAs(makeGroundPlan(block), 'old', sense, random.fork('again'));
  return coverOf(again, block) > coverOf(filled, block) ? again : filled;
}

/** Builds up a block about a landmark that stands in it already. */
export function fillAround(
  ground: GroundPlan,
  landmark: Footprint,
  style: BlockStyle,
  sense: StreetSense,
  random: Random,
): Filled {
  const rest = fillAs(
    ground,
    style === 'green' || style === 'terrace' ? style : 'old',
    sense,
    random,
  );
  return { ...rest, footprints: [landmark, ...rest.footprints] };
}
