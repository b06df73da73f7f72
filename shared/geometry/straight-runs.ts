import type { PolylinePart } from './polyline-parts.ts';
import { straightRunEnd, type StraightTolerance } from './straight-run-end.ts';

/**
 * The longest straight runs of a chain of parts: from each part the farthest straight run, less those
 * that lie inside another. A bend gives runs that overlap, so that no run depends on where the chain
 * is read from.
 *
 * Units: m. Valid: parts follow one another, in a closed chain the first follows the last; a run
 * never takes in a part twice. Source: [own].
 */
export function straightRuns<Part extends PolylinePart>(
  chain: readonly Part[],
  closed: boolean,
  tolerance: StraightTolerance,
): Part[][] {
  const count = chain.length;
  const parts = closed ? [...chain, ...chain] : chain;
  const ends: number[] = [];
  let farthest = -1;
  for (let from = 0; from < count; from++) {
    if (!closed && farthest === count - 1) break;
    const last = closed ? from + count - 1 : count - 1;
    const end = straightRunEnd(parts, from, last, tolerance);
    ends.push(end);
    farthest = Math.max(farthest, end);
  }
  let reached = closed ? farthest - count : -1;
  const runs: Part[][] = [];
  for (const [from, end] of ends.entries()) {
    if (end <= reached) continue;
    reached = end;
    runs.push(parts.slice(from, end + 1));
  }
  return runs;
}
