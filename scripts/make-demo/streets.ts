import { allCrossings, settleEnds } from './crossings.ts';
import type { Field } from './field.ts';
import { lineLength, pointAt, simplify, slice } from './lines.ts';
import { mainStreets } from './main-streets.ts';
import type { RawStreet } from './main-streets.ts';
import type { Random } from './prng.ts';
import { growFamily } from './streamlines.ts';
import type { Family, Growth } from './streamlines.ts';
import type { Terrain } from './terrain.ts';
import { itemAt } from './vector.ts';
import type { Line, Point } from './vector.ts';

/** How far apart streets lie: close in the old town, wide at its edge. */
function spacingOf(terrain: Terrain): Growth['spacing'] {
  const ranges: Record<Family, readonly [number, number]> = { 0: [44, 62], 1: [56, 104] };
  return (at, family) => {
    const [near, far] = ranges[family];
    const share = Math.min(1, Math.max(0, (terrain.age(at) - 0.45) / 1.1));
    return near + (far - near) * share;
  };
}

function widthAt(terrain: Terrain, at: Point, random: Random): number {
  return terrain.age(at) < 0.75
    ? random.pick([4.5, 5, 5, 5.5, 6, 7])
    : random.pick([5.5, 6, 6, 6.5, 7, 7.5]);
}

function middleOf(line: Line): Point {
  return pointAt(line, lineLength(line) / 2).point;
}

function growAll(terrain: Terrain, field: Field, random: Random): RawStreet[] {
  const fixed = mainStreets(terrain.water, terrain.sites);
  const there = fixed.map(({ line }) => line);
  const growth: Growth = { field, allows: terrain.allowsStreet, spacing: spacingOf(terrain) };
  const alongShore = growFamily(growth, there, 0, []);
  const across = growFamily(growth, there, 1, [...there, ...alongShore]);
  const free = [...alongShore, ...across].map((line): RawStreet => {
    const width = widthAt(terrain, middleOf(line), random);
    return { line, width, class: 'street', name: null, fixed: false };
  });
  return [...fixed, ...free];
}

/** Leaves out some lengths between crossings, so that streets meet at corners and do not run through. */
function thin(street: RawStreet, crossings: readonly number[], random: Random): RawStreet[] {
  if (street.fixed) return [street];
  const stops = [
    0,
    ...crossings.filter((at) => at > 2 && at < lineLength(street.line) - 2),
    lineLength(street.line),
  ];
  const kept: RawStreet[] = [];
  let from = 0;
  for (let index = 1; index < stops.length; index += 1) {
    const [start, end] = [itemAt(stops, index - 1), itemAt(stops, index)];
    if (!random.chance(0.1)) continue;
    if (start - from > 3) kept.push({ ...street, line: slice(street.line, from, start) });
    from = end;
  }
  const total = lineLength(street.line);
  if (total - from > 3) kept.push({ ...street, line: slice(street.line, from, total) });
  return kept;
}

function settle(streets: readonly RawStreet[], terrain: Terrain, random: Random): RawStreet[] {
  const lines = settleEnds(
    streets.map(({ line }) => line),
    {
      isFixed: (street) => itemAt(streets, street).fixed,
      allows: terrain.allowsStreet,
      deadEnd: () => (random.chance(0.3) ? random.range(28, 48) : 0.6),
    },
  );
  return streets
    .map((street, index) => ({ ...street, line: itemAt(lines, index) }))
    .filter((street) => street.fixed || lineLength(street.line) > 26);
}

/** Lays out all streets but the lanes inside blocks. */
export function layStreets(terrain: Terrain, field: Field, random: Random): RawStreet[] {
  const settled = settle(growAll(terrain, field, random), terrain, random);
  const crossings = allCrossings(settled.map(({ line }) => line));
  const thinned = settled.flatMap((street, index) =>
    thin(street, itemAt(crossings, index), random),
  );
  return settle(thinned, terrain, random).map((street) => ({
    ...street,
    line: simplify(street.line, 0.12),
  }));
}
