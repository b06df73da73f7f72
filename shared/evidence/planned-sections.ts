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
 * Sections that are to be drawn: a stretch along the line, or some across it, one under the other.
 *
 * Units: m. Valid: made by `plannedSections`. Source: [own].
 */
export type PlannedSection = SectionScales &
  (
    | { readonly kind: 'long section'; readonly from: number; readonly to: number }
    | {
        readonly kind: 'cross sections';
        readonly chainages: readonly number[];
        readonly halfWidth: number;
      }
  );

type Asked = Extract<DrawnLayout, { kind: 'sections' }>;

/** In mm: what a section has over the ground and under its lowest level, and to the left for its levels. */
export const [ABOVE, BELOW, ASIDE] = [26, 24, 22] as const;

/** How high a section is that goes from the ground down to the lowest level it shows. */
function heightOf({ exaggeration, denominator }: Asked, depth: number): number {
  return (depth * exaggeration * 1000) / denominator + ABOVE + BELOW;
}

/** From the ground to a little below the invert, the deepest along a stretch. */
export function depthAt(
  { groundLevel, levels, diameter }: AlignmentDesign,
  chainages: readonly number[],
): number {
  const deepest = Math.min(...chainages.map((chainage) => axisLevelAt(levels, chainage)));
  return Math.max(groundLevel - deepest + diameter, diameter);
}

function refuseHigh(asked: Asked, depth: number, { window }: SheetLayout): void {
  if (heightOf(asked, depth) <= window.bottom - window.top) return;
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
  refuseHigh(asked, depthAt(design, stations), layout);
  const { left, right } = layout.window;
  const each = ((right - left - ASIDE - 8) * denominator) / 1000;
  const count = Math.ceil(line.length / each);
  return Array.from({ length: count }, (_, k) => ({
    ...{ kind: 'long section', denominator, exaggeration, settlementExaggeration },
    ...{ from: k * each, to: Math.min(line.length, (k + 1) * each) },
  }));
}

function crossSections(
  asked: Asked,
  line: LineOnGround,
  layout: SheetLayout,
  design: AlignmentDesign,
): PlannedSection[] {
  const { denominator, exaggeration, settlementExaggeration, halfWidth, across } = asked;
  const { left, right, top, bottom } = layout.window;
  if ((2 * halfWidth * 1000) / denominator > right - left - ASIDE - 8) {
    const message =
      'The sections are wider than the sheet. Look less far to either side, or take a smaller scale.';
    throw new MethodError('outside-range', message, 'halfWidth');
  }
  const beyond = across.find((chainage) => chainage > line.length);
  if (beyond !== undefined) {
    const message = `The line ends before chainage ${beyond} m.`;
    throw new MethodError('outside-range', message, 'across');
  }
  const depth = across.length === 0 ? 0 : depthAt(design, across);
  if (across.length > 0) refuseHigh(asked, depth, layout);
  const each = Math.max(1, Math.floor((bottom - top) / heightOf(asked, depth)));
  const sheets = Array.from({ length: Math.ceil(across.length / each) }, (_, k) =>
    across.slice(k * each, (k + 1) * each),
  );
  return sheets.map((chainages) => ({
    ...{
      kind: 'cross sections',
      denominator,
      exaggeration,
      settlementExaggeration,
      chainages,
      halfWidth,
    },
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

/**
 * The ground that sections show, so that the buildings on it can be sought.
 *
 * Units: m. Valid: any section of the line. Source: [own].
 */
export function boxOfSection(planned: PlannedSection, line: LineOnGround): Box {
  if (planned.kind === 'long section') return boundingBox(line.between(planned.from, planned.to));
  const { chainages, halfWidth } = planned;
  return boundingBox(
    chainages.flatMap((chainage): PlanPoint[] => {
      const [[e, n], [dx, dy]] = [line.pointAt(chainage), line.directionAt(chainage)];
      return [
        [e - halfWidth * dy, n + halfWidth * dx],
        [e + halfWidth * dy, n - halfWidth * dx],
      ];
    }),
  );
}
