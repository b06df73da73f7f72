import { MethodError } from '../method-error.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import { EVIDENCE_LIMITS, type DrawnLayout, type PlanContent } from '../schemas/evidence.ts';
import { groundFrame, type GroundFrame } from './ground-frame.ts';
import { lineOnGround, type LineOnGround } from './line-on-ground.ts';
import { sheetLayout, type SheetLayout } from './paper-sizes.ts';
import { plannedSections, type PlannedSection } from './planned-sections.ts';
import { stripStretches } from './strip-stretches.ts';

/**
 * Where a sheet of a series ends and another goes on: a chainage of the line, and the sheet beyond it.
 *
 * Units: m. Valid: `isAhead` where the other sheet shows larger chainages. Source: [own].
 */
export type MatchLine = {
  readonly chainage: number;
  readonly sheet: number;
  readonly isAhead: boolean;
};

/**
 * A plan that is to be drawn.
 *
 * Units: as the parts. Valid: made by `plannedSheets`; `stretch` are the chainages of a sheet of a series.
 * Source: [own].
 */
export type PlannedPlan = {
  readonly kind: 'plan';
  readonly frame: GroundFrame;
  readonly content: PlanContent;
  readonly stretch: readonly [from: number, to: number] | null;
  readonly matches: readonly MatchLine[];
};

/**
 * A sheet that is to be drawn: its place among the others, the paper it lies on, and what is on it.
 *
 * Units: mm. Valid: numbers from 1. Source: [own].
 */
export type PlannedSheet = {
  readonly number: number;
  readonly of: number;
  readonly layout: SheetLayout;
  readonly what: PlannedPlan | PlannedSection;
};

function groundOf({ window }: SheetLayout, denominator: number) {
  const metres = denominator / 1000;
  return {
    wide: (window.right - window.left) * metres,
    tall: (window.bottom - window.top) * metres,
  };
}

/** The match lines of a sheet of a series, each in the middle of the overlap with the next sheet. */
function matchesOf(
  stretches: readonly { readonly from: number; readonly to: number }[],
  k: number,
): MatchLine[] {
  const [before, own, after] = [stretches[k - 1], stretches[k], stretches[k + 1]];
  if (own === undefined) return [];
  return [
    ...(before === undefined
      ? []
      : [{ chainage: (before.to + own.from) / 2, sheet: k, isAhead: false }]),
    ...(after === undefined
      ? []
      : [{ chainage: (own.to + after.from) / 2, sheet: k + 2, isAhead: true }]),
  ];
}

function stripPlans(
  { from, to, overlap, denominator, content }: Extract<DrawnLayout, { kind: 'strip' }>,
  line: LineOnGround,
  layout: SheetLayout,
): PlannedPlan[] {
  const end = Math.min(line.length, to ?? line.length);
  if (from >= end) {
    throw new MethodError('outside-range', 'The stretch begins where the line has ended.', 'from');
  }
  const stretches = stripStretches(line, {
    ...groundOf(layout, denominator),
    from,
    to: end,
    overlap,
    most: EVIDENCE_LIMITS.sheets,
  });
  return stretches.map((stretch, k) => ({
    kind: 'plan',
    frame: groundFrame(layout.window, { ...stretch, denominator }),
    content,
    stretch: [stretch.from, stretch.to],
    matches: matchesOf(stretches, k),
  }));
}

function whatOf(
  asked: DrawnLayout,
  line: LineOnGround,
  layout: SheetLayout,
  design: AlignmentDesign,
): PlannedSheet['what'][] {
  if (asked.kind === 'strip') return stripPlans(asked, line, layout);
  if (asked.kind === 'sections') return plannedSections(asked, line, layout, design);
  const { centre, denominator, content } = asked;
  const frame = groundFrame(layout.window, { centre, denominator });
  return [{ kind: 'plan', frame, content, stretch: null, matches: [] }];
}

/**
 * The sheets of a layout, before anything is drawn.
 *
 * Units: as DrawnLayout. Valid: throws `outside-range` with the field to change where nothing of the line is
 * left, sections do not fit on the paper, or there would be more sheets than one print may have.
 * Source: [own].
 */
export function plannedSheets(asked: DrawnLayout, design: AlignmentDesign): PlannedSheet[] {
  const layout = sheetLayout(asked.paper);
  const found = whatOf(asked, lineOnGround(design.line), layout, design);
  if (found.length > EVIDENCE_LIMITS.sheets) {
    const message = `This would take more than ${EVIDENCE_LIMITS.sheets} sheets. Print at most so many at a time.`;
    throw new MethodError('outside-range', message, 'denominator');
  }
  return found.map((what, k) => ({ number: k + 1, of: found.length, layout, what }));
}
