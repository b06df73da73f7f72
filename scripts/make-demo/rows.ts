import { footprint } from './footprints.ts';
import type { Footprint, Kind } from './footprints.ts';
import { tidy } from './ground-plan.ts';
import type { GroundPlan } from './ground-plan.ts';
import { frontOf, houseRing, nodesOf } from './houses.ts';
import type { House, Nodes, Wing } from './houses.ts';
import { makeOutline } from './outline.ts';
import type { Outline } from './outline.ts';
import { signedArea } from './polygons.ts';
import { planRow } from './row-plan.ts';
import type { Plot, PlotRule } from './row-plan.ts';
import type { Random } from './prng.ts';
import type { Ring } from './vector.ts';

/** How the houses of a row are drawn on their plots. */
export type RowStyle = {
  readonly label: string;
  readonly rule: PlotRule;
  readonly depth: (plot: Plot, random: Random) => number;
  /** Open ground kept behind, from the house's back to the middle of the block. */
  readonly court: number;
  readonly leastDepth: number;
  readonly wing: (plot: Plot, place: number, random: Random) => Wing | null;
  readonly kind: (plot: Plot, random: Random) => Kind;
};
/** A plot with the house that was built on it. */
export type Built = { readonly plot: Plot; readonly house: House; readonly footprint: Footprint };

function limitOf(plot: Plot): number {
  return Math.min(plot.from.limit, plot.to.limit);
}

function depthOn(plot: Plot, style: RowStyle, random: Random): number {
  if (plot.corner === null) return Math.min(style.depth(plot, random), limitOf(plot) - style.court);
  const half = Math.tan((Math.PI - plot.corner.turn) / 2);
  const reach = Math.min(plot.to.station - plot.corner.station, 24);
  const folded = ((reach % 1000) + 1000) % 1000;
  return Math.min(style.rule.depth, folded * Math.max(half, 0.3) * 0.98);
}

function drawHouse(plot: Plot, place: number, style: RowStyle, random: Random): House | null {
  const depth = depthOn(plot, style, random);
  if (plot.open || depth < style.leastDepth) return null;
  const wing = plot.corner === null ? style.wing(plot, place, random) : null;
  const room = limitOf(plot) - depth - style.court;
  const length = wing === null ? 0 : Math.min(wing.length, room);
  return { plot, depth, wing: wing === null || length < 1.8 ? null : { ...wing, length } };
}

/** Nothing smaller than this is lived in. */
const leastHouse = 24;

function ringThatFits(
  outline: Outline,
  house: House,
  nodes: Nodes,
  ground: GroundPlan,
): Ring | null {
  for (const wing of [house.wing, null]) {
    for (const share of [1, 0.8, 0.62]) {
      const shape = { ...house, wing, depth: house.depth * share };
      const ring = tidy(houseRing(outline, shape, nodes));
      if (signedArea(ring) >= leastHouse && ground.fits(ring)) return ring;
    }
    if (house.wing === null) return null;
  }
  return null;
}

/** Builds a row all round a ring that lies in a block: the block's edge, or set back from it. */
export function buildRow(ring: Ring, ground: GroundPlan, style: RowStyle, random: Random): Built[] {
  const outline = makeOutline(ring);
  const plots = planRow(outline, style.rule, random);
  const houses = plots.flatMap((plot, place) => drawHouse(plot, place, style, random) ?? []);
  const nodes = nodesOf(houses);
  return houses.flatMap((house): Built[] => {
    const shape = ringThatFits(outline, house, nodes, ground);
    if (shape === null) return [];
    ground.build(shape);
    const { plot } = house;
    const row = `${style.label}-${plot.run}`;
    const drawn = footprint(shape, style.kind(plot, random), frontOf(plot), {
      row,
      corner: plot.corner !== null,
    });
    return [{ plot, house, footprint: drawn }];
  });
}
