import { at } from '../numerics/at.ts';
import { findRoot } from '../numerics/find-root.ts';
import { crossings } from './crossings.ts';
import type { Profile } from './profile.ts';
import { profileValue } from './profile-value.ts';

/**
 * The way a wall bends: sagging where the ground curves upwards like a bowl, hogging where it curves
 * over.
 *
 * Units: none. Valid: closed list. Source: burland-wroth-1974.
 */
export type Mode = 'sagging' | 'hogging';

/**
 * A stretch of wall bent one way.
 *
 * Units: m from the wall's start. Valid: start < end. Source: [own].
 */
export type Stretch = { readonly mode: Mode; readonly start: number; readonly end: number };

/**
 * Curvature below which a wall counts as flat.
 *
 * Units: 1/m. Valid: a constant. Source: [own].
 */
export const FLAT_CURVATURE = 1e-8;

/**
 * The shortest zone.
 *
 * Units: m. Valid: a constant. Source: [common].
 */
export const SHORTEST_ZONE = 0.5;

type Run = { side: -1 | 0 | 1; start: number; end: number };

function sideOf(curvature: number, flat: number): -1 | 0 | 1 {
  if (curvature > flat) return 1;
  return curvature < -flat ? -1 : 0;
}

function addRun(runs: Run[], run: Run): void {
  const last = runs.at(-1);
  if (last?.side === run.side) last.end = run.end;
  else runs.push(run);
}

function sidesAlong(profile: Profile, flat: number): Run[] {
  const runs: Run[] = [];
  const { nodes, curvatureHull } = profile;
  for (let k = 0; k < nodes.length - 1; k++) {
    const [start, end] = [at(nodes, k), at(nodes, k + 1)];
    const [low, high] = [at(curvatureHull, 2 * k), at(curvatureHull, 2 * k + 1)];
    if (low > flat) addRun(runs, { side: 1, start, end });
    else if (high < -flat) addRun(runs, { side: -1, start, end });
    else if (low > -flat && high < flat) addRun(runs, { side: 0, start, end });
    else {
      const cuts = [
        ...crossings(profile, 'curvature', flat, start, end),
        ...crossings(profile, 'curvature', -flat, start, end),
      ].sort((a, b) => a - b);
      let from = start;
      for (const to of [...cuts, end]) {
        if (to <= from) continue;
        const middle = profileValue(profile, 'curvature', (from + to) / 2);
        addRun(runs, { side: sideOf(middle, flat), start: from, end: to });
        from = to;
      }
    }
  }
  return runs;
}

/**
 * Closes a flat stretch too short to be a zone of its own: over it a wall bent one way on both sides
 * bends on, and one bent both ways turns at the root of the curvature.
 */
function closeShortFlats(profile: Profile, runs: Run[]): Run[] {
  const closed: Run[] = [];
  for (const [index, run] of runs.entries()) {
    const [before, after] = [closed.at(-1), runs[index + 1]];
    const short = run.side === 0 && run.end - run.start < SHORTEST_ZONE;
    if (!short || before === undefined || after === undefined || before.side === 0) {
      addRun(closed, { ...run });
      continue;
    }
    if (before.side === after.side) {
      before.end = run.end;
      continue;
    }
    const turn = findRoot((x) => profileValue(profile, 'curvature', x), run.start, run.end, 1e-12);
    before.end = turn;
    after.start = turn;
  }
  return closed;
}

/**
 * The stretches of a wall bent one way, split where the curvature changes sign; neighbours that turn
 * into each other share the very same point. Where the curvature stays under `flat` there is none.
 *
 * Units: m, flat in 1/m. Valid: any profile. Source: [own].
 */
export function curvatureRuns(profile: Profile, flat: number): Stretch[] {
  return closeShortFlats(profile, sidesAlong(profile, flat)).flatMap(({ side, start, end }) =>
    side === 0 ? [] : [{ mode: side > 0 ? 'hogging' : 'sagging', start, end } as const],
  );
}
