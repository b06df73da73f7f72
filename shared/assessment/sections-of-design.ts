import { chainages } from '../geometry/chainages.ts';
import { pointAtChainage } from '../geometry/point-at-chainage.ts';
import type { PlanPoint, SpacePoint } from '../geometry/point.ts';
import { polylineParts } from '../geometry/polyline-parts.ts';
import type { GroundRules } from '../ground/ground-model.ts';
import { at } from '../numerics/at.ts';
import { intervalIndex } from '../numerics/interval-index.ts';
import type { Range } from '../numerics/range.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import { axisLevelAt } from './axis-level-at.ts';
import { boresOfDesign } from './bores-of-design.ts';
import { settlementBracket } from './settlement-bracket.ts';

/**
 * The ground across a designed line: settlement of its surface by offset, positive to the left, with the
 * bores below it. `middle` is on the line, `left` points to the left of it.
 *
 * Units: m, levels above datum. Valid: made by `sectionsOfDesign`; settlement is null where the method
 * refuses; low and high are the least and the most over the bracket. Source: attewell-woodman-1982.
 */
export type SectionAcross = {
  readonly chainage: number;
  readonly middle: PlanPoint;
  readonly left: PlanPoint;
  readonly groundLevel: number;
  readonly points: readonly { readonly offset: number; readonly settlement: Range | null }[];
  readonly bores: readonly {
    readonly name: string;
    readonly offset: number;
    readonly axis: number;
    readonly diameter: number;
  }[];
};

/**
 * Sections across a designed line, one after the other: its chainage and how far to look to either side.
 *
 * Units: m. Valid: before its start and past its end the section there. Source: as SectionAcross.
 */
export type SectionsOfDesign = (chainage: number, halfWidth: number) => SectionAcross;

const POINTS_PER_WIDTH = 8;
/** To either side. */
const POINTS = { least: 20, most: 200 };

/**
 * Prepares sections across a designed line.
 *
 * Units: m. Valid: throws as `drivesOfDesign`. Source: as SectionAcross; the bracket is [own].
 */
export function sectionsOfDesign(design: AlignmentDesign, rules: GroundRules): SectionsOfDesign {
  const bracket = settlementBracket(design, rules);
  const { groundLevel, levels, diameter } = design;
  const line = design.line.map(([e, n]): SpacePoint => [e, n, 0]);
  const [stations, parts] = [chainages(line), polylineParts(line)];

  return (wanted, halfWidth) => {
    const chainage = Math.min(at(stations, stations.length - 1), Math.max(0, wanted));
    const [e, n] = pointAtChainage(line, stations, chainage);
    const [dx, dy] = parts[intervalIndex(stations, chainage)]?.direction ?? [1, 0];
    const left: PlanPoint = [-dy, dx];
    const fine = Math.ceil((POINTS_PER_WIDTH * halfWidth) / bracket.narrowestAt([e, n]));
    const count = Math.min(POINTS.most, Math.max(POINTS.least, fine));
    const points = Array.from({ length: 2 * count + 1 }, (_, k) => {
      const offset = ((k - count) * halfWidth) / count;
      const point: PlanPoint = [e + offset * left[0], n + offset * left[1]];
      return { offset, settlement: bracket.at(point) };
    });
    const axis = axisLevelAt(levels, chainage);
    const bores = boresOfDesign(design).map(({ name, offset }) => ({
      ...{ name, offset, axis, diameter },
    }));
    return { chainage, middle: [e, n], left, groundLevel, points, bores };
  };
}
