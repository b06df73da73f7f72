import { chainages } from '../geometry/chainages.ts';
import { pointAtChainage } from '../geometry/point-at-chainage.ts';
import type { PlanPoint, SpacePoint } from '../geometry/point.ts';
import { polylineParts } from '../geometry/polyline-parts.ts';
import { groundModel, type GroundRules } from '../ground/ground-model.ts';
import { groundSurface, type GroundSurface } from '../ground/ground-surface.ts';
import { FIELD } from '../ground/kernel.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import { troughWidthMatters } from '../ground/trough-width-matters.ts';
import { at } from '../numerics/at.ts';
import { intervalIndex } from '../numerics/interval-index.ts';
import { CENTRAL, FIVE_POSITIONS, type Range } from '../numerics/range.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import { axisLevelAt } from './axis-level-at.ts';
import { boresOfDesign } from './bores-of-design.ts';
import { drivesOfDesign } from './drives-of-design.ts';

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

function settlementOf(surface: GroundSurface, point: PlanPoint): number | undefined {
  const field = surface.at(point);
  return field === undefined ? undefined : at(field, FIELD.settlement);
}

/** The least, central and most settlement over volume losses and K at a point. */
function bracketAt(
  central: GroundSurface,
  ends: readonly GroundSurface[],
  point: PlanPoint,
): Range | null {
  const middle = settlementOf(central, point);
  const all = ends.map((surface) => settlementOf(surface, point));
  const known = all.filter((settlement) => settlement !== undefined);
  if (middle === undefined || known.length < all.length) return null;
  return { low: Math.min(middle, ...known), central: middle, high: Math.max(middle, ...known) };
}

/**
 * Prepares sections across a designed line. Settlement grows with volume loss, so that the least and the
 * most of the bracket are among its ends, at one of the five positions of K.
 *
 * Units: m. Valid: throws as `drivesOfDesign`. Source: as SectionAcross; the bracket is [own].
 */
export function sectionsOfDesign(design: AlignmentDesign, rules: GroundRules): SectionsOfDesign {
  const model = groundModel(drivesOfDesign(design), rules);
  const { groundLevel, levels, diameter } = design;
  const positions = troughWidthMatters(model) ? FIVE_POSITIONS : [CENTRAL];
  const surfaceOf = (position: (typeof positions)[number], end: keyof Range) =>
    groundSurface(model, groundLevel, { position, faces: [] }, lossFactorsAt(model, end));
  const central = surfaceOf(CENTRAL, 'central');
  const ends = positions.flatMap((position) => [
    surfaceOf(position, 'low'),
    surfaceOf(position, 'high'),
  ]);
  const line = design.line.map(([e, n]): SpacePoint => [e, n, 0]);
  const [stations, parts] = [chainages(line), polylineParts(line)];

  return (wanted, halfWidth) => {
    const chainage = Math.min(at(stations, stations.length - 1), Math.max(0, wanted));
    const [e, n] = pointAtChainage(line, stations, chainage);
    const [dx, dy] = parts[intervalIndex(stations, chainage)]?.direction ?? [1, 0];
    const left: PlanPoint = [-dy, dx];
    const widths = ends.map((surface) => surface.widthAt([e, n]) ?? Infinity);
    const fine = Math.ceil((POINTS_PER_WIDTH * halfWidth) / Math.min(...widths));
    const count = Math.min(POINTS.most, Math.max(POINTS.least, fine));
    const points = Array.from({ length: 2 * count + 1 }, (_, k) => {
      const offset = ((k - count) * halfWidth) / count;
      const point: PlanPoint = [e + offset * left[0], n + offset * left[1]];
      return { offset, settlement: bracketAt(central, ends, point) };
    });
    const axis = axisLevelAt(levels, chainage);
    const bores = boresOfDesign(design).map(({ name, offset }) => ({
      ...{ name, offset, axis, diameter },
    }));
    return { chainage, middle: [e, n], left, groundLevel, points, bores };
  };
}
