import Flatbush from 'flatbush';
import type { Box } from '../../shared/geometry/bounding-box.ts';

/** Follows who leads whom to the one who leads the group, and shortens the way for the next. */
function leaderOf(leaders: Int32Array, index: number): number {
  let leader = index;
  while (leaders[leader] !== leader) {
    const above = leaders[leader] ?? leader;
    leaders[leader] = leaders[above] ?? above;
    leader = above;
  }
  return leader;
}

/**
 * Boxes in groups: within a group each is nearer than `reach` to another. Groups and their members are in
 * the order of the boxes.
 */
export function touchingGroups(boxes: readonly Box[], reach: number): number[][] {
  if (boxes.length === 0) return [];
  const index = new Flatbush(boxes.length);
  for (const { west, south, east, north } of boxes) index.add(west, south, east, north);
  index.finish();
  const leaders = Int32Array.from(boxes, (_, k) => k);
  for (const [k, { west, south, east, north }] of boxes.entries()) {
    index.search(west - reach, south - reach, east + reach, north + reach, (other) => {
      if (other <= k) return false;
      const [a, b] = [leaderOf(leaders, k), leaderOf(leaders, other)];
      leaders[Math.max(a, b)] = Math.min(a, b);
      return false;
    });
  }
  const groups = new Map<number, number[]>();
  for (const k of boxes.keys()) {
    const leader = leaderOf(leaders, k);
    const group = groups.get(leader);
    if (group === undefined) groups.set(leader, [k]);
    else group.push(k);
  }
  return [...groups.values()];
}
