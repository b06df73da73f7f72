import { SHORTEST_ZONE, type Stretch } from './curvature-runs.ts';

function lengthOf(stretch: Stretch): number {
  return stretch.end - stretch.start;
}

function shortestSliver(stretches: readonly Stretch[]): number {
  let found = -1;
  let least = SHORTEST_ZONE;
  for (const [index, stretch] of stretches.entries()) {
    if (lengthOf(stretch) < least) {
      least = lengthOf(stretch);
      found = index;
    }
  }
  return found;
}

function joinOne(stretches: Stretch[], index: number): void {
  const sliver = stretches[index];
  if (sliver === undefined) return;
  const [before, after] = [stretches[index - 1], stretches[index + 1]];
  const left = before?.end === sliver.start ? before : undefined;
  const right = after?.start === sliver.end ? after : undefined;
  if (left !== undefined && right?.mode === left.mode) {
    stretches.splice(index - 1, 3, { mode: left.mode, start: left.start, end: right.end });
  } else if (left !== undefined && (right === undefined || lengthOf(left) >= lengthOf(right))) {
    stretches.splice(index - 1, 2, { mode: left.mode, start: left.start, end: sliver.end });
  } else if (right !== undefined) {
    stretches.splice(index, 2, { mode: right.mode, start: sliver.start, end: right.end });
  } else {
    stretches.splice(index, 1);
  }
}

/**
 * Stretches without slivers: one under 0.5 m between two of one mode joins both, any other joins the
 * longer neighbour that it touches, and one that touches none makes no zone. Where no stretch reaches
 * 0.5 m but together they do, all is one zone of the mode that `modeOfWhole` tells; under 0.5 m in
 * all there is none.
 *
 * Units: m. Valid: stretches in order, not overlapping. Source: [common].
 */
export function joinSlivers(
  stretches: readonly Stretch[],
  modeOfWhole: (start: number, end: number) => Stretch['mode'],
): Stretch[] {
  const [first, last] = [stretches[0], stretches.at(-1)];
  const affected = stretches.reduce((sum, stretch) => sum + lengthOf(stretch), 0);
  if (first === undefined || last === undefined || affected < SHORTEST_ZONE) return [];
  if (stretches.every((stretch) => lengthOf(stretch) < SHORTEST_ZONE)) {
    const [start, end] = [first.start, last.end];
    return [{ mode: modeOfWhole(start, end), start, end }];
  }
  const joined = [...stretches];
  for (let index = shortestSliver(joined); index >= 0; index = shortestSliver(joined)) {
    joinOne(joined, index);
  }
  return joined;
}
