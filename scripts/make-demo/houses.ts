import { bendsBetween } from './outline.ts';
import type { Outline } from './outline.ts';
import { crossing } from './polygons.ts';
import { keyOf } from './row-plan.ts';
import type { PartyLine, Plot } from './row-plan.ts';
import { along, between, direction, distance, itemAt } from './vector.ts';
import type { Point, Ring } from './vector.ts';

/** A part of a house that reaches further back, along one of its party walls. */
export type Wing = {
  readonly side: 'from' | 'to';
  readonly width: number;
  readonly length: number;
};
/** A house drawn on its plot, before party walls are noded. */
export type House = { readonly plot: Plot; readonly depth: number; readonly wing: Wing | null };

function reachAlong(house: House, side: 'from' | 'to'): number {
  return house.depth + (house.wing?.side === side ? house.wing.length : 0);
}

/** Depths at which some house ends on each party line: its neighbours get a corner there as well. */
export type Nodes = ReadonlyMap<string, readonly number[]>;

export function nodesOf(houses: readonly House[]): Nodes {
  const nodes = new Map<string, number[]>();
  for (const house of houses) {
    for (const side of ['from', 'to'] as const) {
      const key = keyOf(house.plot[side]);
      nodes.set(key, [...(nodes.get(key) ?? []), reachAlong(house, side)]);
    }
  }
  return nodes;
}

/** Points up a party wall from the street to the back, with a corner wherever a neighbour ends. */
function wall(line: PartyLine, reach: number, nodes: Nodes): Point[] {
  const depths = (nodes.get(keyOf(line)) ?? []).filter((depth) => depth < reach - 0.05);
  const sorted = [...new Set(depths)].sort((a, b) => a - b);
  const spread = sorted.filter(
    (depth, index) => index === 0 || depth - itemAt(sorted, index - 1) > 0.05,
  );
  return [...spread, reach].map((depth) => along(line.at, line.inward, depth));
}

function backOf(house: House): Point[] {
  const { plot, depth, wing } = house;
  const near = along(plot.from.at, plot.from.inward, depth);
  const far = along(plot.to.at, plot.to.inward, depth);
  if (wing === null) return [];
  const share = wing.width / Math.max(distance(near, far), 0.1);
  const isTo = wing.side === 'to';
  const foot = isTo ? between(far, near, share) : between(near, far, share);
  const tip = along(foot, isTo ? plot.to.inward : plot.from.inward, wing.length);
  return isTo ? [tip, foot] : [foot, tip];
}

/** Where the backs of the two arms of a corner house meet. */
function elbow(house: House, at: Point): Point[] {
  const { from, to } = house.plot;
  const [a, b] = [along(from.at, from.inward, house.depth), along(to.at, to.inward, house.depth)];
  const ahead = along(a, direction(from.at, at), 60);
  const behind = along(b, direction(to.at, at), 60);
  const hit = crossing(a, ahead, b, behind);
  return hit === null ? [] : [between(a, ahead, hit.first)];
}

/** The ring of a house: street front, one party wall, back, the other party wall. */
export function houseRing(outline: Outline, house: House, nodes: Nodes): Ring {
  const { from, to, corner } = house.plot;
  const front =
    corner === null
      ? bendsBetween(outline, from.station, to.station, 0.22)
      : [
          ...bendsBetween(outline, from.station, corner.station, 0.22),
          corner.at,
          ...bendsBetween(outline, corner.station, to.station, 0.22),
        ];
  const back = corner === null ? backOf(house) : elbow(house, corner.at);
  return [
    from.at,
    ...front,
    to.at,
    ...wall(to, reachAlong(house, 'to'), nodes),
    ...back,
    ...wall(from, reachAlong(house, 'from'), nodes).reverse(),
  ];
}

export function frontOf(plot: Plot): Point {
  return plot.corner === null
    ? between(plot.from.at, plot.to.at, 0.5)
    : between(plot.corner.at, plot.to.at, 0.4);
}
