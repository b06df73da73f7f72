import { reversedFacade, type Facade } from './facade.ts';
import { facadeLinks, type FacadeEnd, type FacadeLink } from './facade-links.ts';
import type { RowTolerance } from './row-tolerance.ts';

/**
 * Façades end to end, each read in the direction of the chain; in a closed one the first follows the
 * last.
 *
 * Units: m. Valid: at least two façades, none in two chains. Source: [own].
 */
export type FacadeChain = { readonly facades: readonly Facade[]; readonly closed: boolean };

type Building = readonly Facade[];
type Pair = readonly [Building, Building];

/** For each side, the façades linked there, with the end that they are linked to. */
type Joints = { readonly start: Map<Facade, FacadeEnd>; readonly end: Map<Facade, FacadeEnd> };

function opposite({ facade, side }: FacadeEnd): FacadeEnd {
  return { facade, side: side === 'start' ? 'end' : 'start' };
}

function allLinks(joined: readonly Pair[], tolerance: RowTolerance): FacadeLink[] {
  const links: FacadeLink[] = [];
  for (const building of new Set(joined.flat())) {
    for (const [k, a] of building.entries()) {
      for (const b of building.slice(k + 1)) links.push(...facadeLinks(a, b, tolerance));
    }
  }
  for (const [one, other] of joined) {
    for (const a of one) for (const b of other) links.push(...facadeLinks(a, b, tolerance));
  }
  return links;
}

/** The closest links, each end being linked once at most. */
function jointsOf(links: readonly FacadeLink[]): Joints {
  const joints: Joints = { start: new Map(), end: new Map() };
  for (const { ends } of [...links].sort((a, b) => a.gap - b.gap || a.turn - b.turn)) {
    const [a, b] = ends;
    if (joints[a.side].has(a.facade) || joints[b.side].has(b.facade)) continue;
    joints[a.side].set(a.facade, b);
    joints[b.side].set(b.facade, a);
  }
  return joints;
}

/** The ends by which a chain is left, façade by façade, on the way out of one end. */
function wayOut(from: FacadeEnd, joints: Joints): FacadeEnd[] {
  const way = [from];
  let joint = joints[from.side].get(from.facade);
  while (joint !== undefined && joint.facade !== from.facade) {
    const exit = opposite(joint);
    way.push(exit);
    joint = joints[exit.side].get(exit.facade);
  }
  return way;
}

/**
 * The façades of joined buildings in chains: a façade goes on as the nearest façade, of its own
 * building or of one joined to it, that starts where it ends.
 *
 * Units: m. Valid: pairs as `joinedBuildings` gives them. Source: [own].
 */
export function facadeChains(joined: readonly Pair[], tolerance: RowTolerance): FacadeChain[] {
  const joints = jointsOf(allLinks(joined, tolerance));
  const seen = new Set<Facade>();
  const chains: FacadeChain[] = [];
  for (const facade of [...joints.start.keys(), ...joints.end.keys()]) {
    if (seen.has(facade)) continue;
    const last = wayOut({ facade, side: 'start' }, joints).at(-1) ?? { facade, side: 'start' };
    const way = wayOut(opposite(last), joints);
    for (const exit of way) seen.add(exit.facade);
    chains.push({
      facades: way.map((exit) => (exit.side === 'end' ? exit.facade : reversedFacade(exit.facade))),
      closed: joints[last.side].has(last.facade),
    });
  }
  return chains;
}
