import { chainages } from '../geometry/chainages.ts';
import { at } from '../numerics/at.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import { axisLevelAt } from './axis-level-at.ts';

/**
 * The levels along a designed line at one chainage.
 *
 * Units: m, levels above datum. Valid: made by `longSection`. Source: [own].
 */
export type LongSectionRow = {
  readonly chainage: number;
  readonly ground: number;
  readonly crown: number;
  readonly axis: number;
  readonly invert: number;
};

/**
 * Ground, crown, axis and invert along a designed line: at its ends and wherever a level is given;
 * straight between the rows.
 *
 * Units: m. Valid: throws `zero-length` where two points of the line coincide. Source: [own].
 */
export function longSection(design: AlignmentDesign): LongSectionRow[] {
  const stations = chainages(design.line);
  const end = at(stations, stations.length - 1);
  const given = design.levels.map(({ chainage }) => chainage);
  const rows = [0, ...given.filter((chainage) => chainage > 0 && chainage < end), end];
  const radius = design.diameter / 2;
  return rows.map((chainage) => {
    const axis = axisLevelAt(design.levels, chainage);
    const [crown, invert] = [axis + radius, axis - radius];
    return { chainage, ground: design.groundLevel, crown, axis, invert };
  });
}
