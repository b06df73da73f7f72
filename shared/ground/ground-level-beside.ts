import { nearestOnSegment } from '../geometry/nearest-on-segment.ts';
import type { PlanPoint } from '../geometry/point.ts';
import type { GroundLevelRow } from './drive.ts';
import type { GroundModel } from './ground-model.ts';

function interpolated(rows: readonly GroundLevelRow[], chainage: number): number | undefined {
  const [first] = rows;
  if (first === undefined) return undefined;
  let before = first;
  for (const row of rows) {
    if (row.chainage > chainage) {
      if (row === first) return row.level;
      const share = (chainage - before.chainage) / (row.chainage - before.chainage);
      return before.level + share * (row.level - before.level);
    }
    before = row;
  }
  return before.level;
}

/**
 * The ground level that the table of the nearest drive gives at the chainage nearest to a point: what a
 * wall without a ground level of its own takes, and is then marked with.
 *
 * Units: m above datum. Valid: undefined where no drive has a table; beyond its ends the nearest row.
 * Source: [own].
 */
export function groundLevelBeside(model: GroundModel, point: PlanPoint): number | undefined {
  let [nearest, level]: [number, number | undefined] = [Infinity, undefined];
  for (const [index, { groundLevels }] of model.drives.entries()) {
    if (groundLevels === undefined) continue;
    for (const piece of model.pieces[index] ?? []) {
      const { share, distance } = nearestOnSegment(point, piece.plan);
      if (distance >= nearest) continue;
      nearest = distance;
      level = interpolated(groundLevels, piece.from + share * piece.length);
    }
  }
  return level;
}
