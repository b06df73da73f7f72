import type { Box } from '../../shared/geometry/bounding-box.ts';
import { nearestOnSegment } from '../../shared/geometry/nearest-on-segment.ts';
import type { PlanPoint } from '../../shared/geometry/point.ts';
import { touchingGroups } from './touching-groups.ts';

/** A building with the box that it stands in, in the scheme's grid. */
export type PlacedBuilding = Box & { readonly id: number };

/**
 * A part of a run: who is assessed in it, and who stands beside them in a group that was too large for one
 * part, so that rows are found whole.
 */
export type Chunk = { readonly members: number[]; readonly beside: number[] };

/** Rows bridge half a metre, and boxes come by way of degrees. */
const TOUCHING = 1;

/** What a building costs, in milliseconds on a slow machine: little where screening lets it go at once. */
const COST = { near: 6, far: 0.5 } as const;

/** A part takes a few seconds at most, and a small run is cut for all threads. */
const MOST_COST = 2500;
const LEAST_COST = 150;
const LEAST_PARTS = 8;

/** Groups are walked in strips of the plan, so that a part lies together. */
const STRIP = 250;

type Near = { readonly line: readonly PlanPoint[]; readonly reach: number };

function isNear({ west, south, east, north }: Box, { line, reach }: Near): boolean {
  const middle: PlanPoint = [(west + east) / 2, (south + north) / 2];
  const half = Math.hypot(east - west, north - south) / 2;
  return line.some((start, k) => {
    const end = line[k + 1];
    return end !== undefined && nearestOnSegment(middle, { start, end }).distance <= reach + half;
  });
}

type Group = { readonly members: { readonly id: number; readonly cost: number }[] };

function costOf(members: Group['members']): number {
  return members.reduce((sum, { cost }) => sum + cost, 0);
}

/** Cuts a group that is too large for a part; each part knows the others. */
function cut({ members }: Group, most: number): Chunk[] {
  const parts: Group['members'][] = [];
  let [part, cost]: [Group['members'], number] = [[], 0];
  for (const member of members) {
    if (part.length > 0 && cost + member.cost > most) {
      parts.push(part);
      [part, cost] = [[], 0];
    }
    part.push(member);
    cost += member.cost;
  }
  parts.push(part);
  return parts.map((own) => {
    const ids = new Set(own.map(({ id }) => id));
    const beside = members.flatMap(({ id }) => (ids.has(id) ? [] : [id]));
    return { members: [...ids], beside };
  });
}

function packed(groups: readonly Group[], most: number): Chunk[] {
  const chunks: Chunk[] = [];
  let [members, cost]: [number[], number] = [[], 0];
  function close(): void {
    if (members.length > 0) chunks.push({ members, beside: [] });
    [members, cost] = [[], 0];
  }
  for (const group of groups) {
    const own = costOf(group.members);
    if (own > most) {
      chunks.push(...cut(group, most));
      continue;
    }
    if (cost + own > most) close();
    members.push(...group.members.map(({ id }) => id));
    cost += own;
  }
  close();
  return chunks;
}

/**
 * Cuts a run into parts of a few seconds: buildings that may share a wall stay together, neighbours too as
 * far as it goes. What a run finds does not depend on how it is cut.
 */
export function planChunks(buildings: readonly PlacedBuilding[], near: Near): Chunk[] {
  const groups = touchingGroups(buildings, TOUCHING)
    .map((indexes) => {
      const members = indexes.flatMap((k) => buildings[k] ?? []);
      const [first] = members;
      const [west, south] = [first?.west ?? 0, first?.south ?? 0];
      return {
        strip: Math.floor(south / STRIP),
        west,
        members: members.map((one) => ({
          id: one.id,
          cost: isNear(one, near) ? COST.near : COST.far,
        })),
      };
    })
    .sort((a, b) => a.strip - b.strip || a.west - b.west);
  const total = groups.reduce((sum, { members }) => sum + costOf(members), 0);
  const most = Math.min(MOST_COST, Math.max(LEAST_COST, total / LEAST_PARTS));
  return packed(groups, most);
}
