import { axisLevelAt } from '../assessment/axis-level-at.ts';
import { boundingBox, type Box } from '../geometry/bounding-box.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { MethodError } from '../method-error.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import type { DrawnLayout } from '../schemas/evidence.ts';
import type { LineOnGround } from './line-on-ground.ts';
import type { SheetLayout } from './paper-sizes.ts';

/**
 * The scales of a section: lengths at 1 : `denominator`, levels so many times larger, settlement so many
 * times larger than lengths.
 *
 * Units: none. Valid: made from a layout. Source: [own].
 */
export type SectionScales = {
  readonly denominator: number;
  readonly exaggeration: number;
  readonly settlementExaggeration: number;
};

/**
 * A stretch of the long section.
 *
 * Units: m of chainage. Valid: from before to. Source: [own].
 */
export type Stretch = { readonly from: number; readonly to: number };

/**
 * Sections that are to be drawn, one under the other and each `depth` of ground deep: stretches along the line,
 * or some across it.
 *
 * Units: m. Valid: made by `plannedSections`. Source: [own].
 */
export type PlannedSection = SectionScales & { readonly depth: number } & (
    | { readonly kind: 'long section'; readonly stretches: readonly Stretch[] }
    | {
        readonly kind: 'cross sections';
        readonly chainages: readonly number[];
        readonly halfWidth: number;
      }
  );

type Asked = Extract<DrawnLayout, { kind: 'sections' }>;

/**
 * What a section has over the ground, under its lowest level, to the left for its levels, and to the right for
 * settlement.
 *
 * Units: mm. Valid: read only. Source: [own].
 */
export const [ABOVE, BELOW, ASIDE, AFTER] = [31, 24, 22, 14] as const;

/**
 * How high a section is that shows so much of the ground.
 *
 * Units: depth m, height mm. Valid: any scales. Source: [own].
 */
export function sectionHeight({
  exaggeration,
  denominator,
  depth,
}: Pick<PlannedSection, 'exaggeration' | 'denominator' | 'depth'>): number {
  return (depth * exaggeration * 1000) / denominator + ABOVE + BELOW;
}

/** As many at a time as fit one under the other on a sheet. */
function bySheet<T>(
  asked: Asked,
  depth: number,
  { window }: SheetLayout,
  all: readonly T[],
): T[][] {
  const each = Math.floor((window.bottom - window.top) / sectionHeight({ ...asked, depth }));
  return Array.from({ length: Math.ceil(all.length / each) }, (_, k) =>
    all.slice(k * each, (k + 1) * each),
  );
}

/** From the ground to a little below the invert, the deepest at some chainages. */
function depthAt(
  { groundLevel, levels, diameter }: AlignmentDesign,
  chainages: readonly number[],
): number {
  const deepest = Math.min(...chainages.map((chainage) => axisLevelAt(levels, chainage)));
  return Math.max(groundLevel - deepest + diameter, diameter);
}

function refuseHigh(asked: Asked, depth: number, { window }: SheetLayout): void {
  if (sectionHeight({ ...asked, depth }) <= window.bottom - window.top) return;
  const message =
    'The section is higher than the sheet. Take a smaller exaggeration, scale or a larger paper.';
  throw new MethodError('outside-range', message, 'exaggeration');
}

function longSections(
  asked: Asked,
  line: LineOnGround,
  layout: SheetLayout,
  design: AlignmentDesign,
): PlannedSection[] {
  const { denominator, exaggeration, settlementExaggeration } = asked;
  const stations = [0, line.length, ...design.levels.map(({ chainage }) => chainage)];
  const depth = depthAt(design, stations);
  refuseHigh(asked, depth, layout);
  const { left, right } = layout.window;
  const each = ((right - left - ASIDE - AFTER) * denominator) / 1000;
  const stretches = Array.from({ length: Math.ceil(line.length / each) }, (_, k) => ({
    ...{ from: k * each, to: Math.min(line.length, (k + 1) * each) },
  }));
  return bySheet(asked, depth, layout, stretches).map((some) => ({
    ...{ kind: 'long section', denominator, exaggeration, settlementExaggeration },
    ...{ depth, stretches: some },
  }));
}

function crossSections(
  asked: Asked,
  line: LineOnGround,
  layout: SheetLayout,
  design: AlignmentDesign,
): PlannedSection[] {
  const { denominator, exaggeration, settlementExaggeration, halfWidth, across } = asked;
  const { left, right } = layout.window;
  if ((2 * halfWidth * 1000) / denominator > right - left - ASIDE - AFTER) {
    const message =
      'The sections are wider than the sheet. Look less far to either side, or take a smaller scale.';
    throw new MethodError('outside-range', message, 'halfWidth');
  }
  const beyond = across.find((chainage) => chainage > line.length);
  if (beyond !== undefined) {
    const message = `The line ends before chainage ${beyond} m.`;
    throw new MethodError('outside-range', message, 'across');
  }
  if (across.length === 0) return [];
  const depth = depthAt(design, across);
  refuseHigh(asked, depth, layout);
  return bySheet(asked, depth, layout, across).map((chainages) => ({
    ...{ kind: 'cross sections', denominator, exaggeration, settlementExaggeration },
    ...{ depth, chainages, halfWidth },
  }));
}

/**
 * The sheets of sections of a layout.
 *
 * Units: as DrawnLayout. Valid: throws `outside-range` with the field to change where a section is wider or
 * higher than the paper, beyond the line, or where none is asked for. Source: [own].
 */
export function plannedSections(
  asked: Asked,
  line: LineOnGround,
  layout: SheetLayout,
  design: AlignmentDesign,
): PlannedSection[] {
  if (!asked.isLong && asked.across.length === 0) {
    throw new MethodError(
      'outside-range',
      'Ask for the long section or for sections at some chainages.',
      'across',
    );
  }
  return [
    ...(asked.isLong ? longSections(asked, line, layout, design) : []),
    ...crossSections(asked, line, layout, design),
  ];
}

/** So far round a section the ground is sought: one along the grid has a box of no width. */
const AROUND = 1;

function pointsOf(planned: PlannedSection, line: LineOnGround): PlanPoint[] {
  if (planned.kind === 'long section') {
    return planned.stretches.flatMap(({ from, to }) => line.between(from, to));
  }
  const { chainages, halfWidth } = planned;
  return chainages.flatMap((chainage): PlanPoint[] => {
    const [[e, n], [dx, dy]] = [line.pointAt(chainage), line.directionAt(chainage)];
    return [
      [e - halfWidth * dy, n + halfWidth * dx],
      [e + halfWidth * dy, n - halfWidth * dx],
    ];
  });
}

/**
 * The ground that sections show, so that the buildings on it can be sought.
 *
 * Units: m. Valid: any section of the line. Source: [own].
 */
export function boxOfSection(planned: PlannedSection, line: LineOnGround): Box {
  const { west, south, east, north } = boundingBox(pointsOf(planned, line));
  return { west: west - AROUND, south: south - AROUND, east: east + AROUND, north: north + AROUND };
}
