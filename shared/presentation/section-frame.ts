import type { WallSection } from '../assessment/section-of-wall.ts';
import { millimetresFromMetres } from '../units/millimetres-from-metres.ts';
import { linearScale, type Scale } from './linear-scale.ts';
import { niceTicks } from './nice-ticks.ts';

/**
 * Where the parts of the section of a wall stand, in pixels.
 *
 * Units: pixels. Valid: read only. Source: [own].
 */
export const SECTION = {
  left: 44,
  right: 12,
  top: 24,
  settlement: 156,
  strip: 17,
  movement: 72,
} as const;

const SETTLEMENT_FOOT = SECTION.top + SECTION.settlement;
/**
 * Of the strip with the horizontal strain of each zone.
 *
 * Units: pixels. Valid: a constant. Source: [own].
 */
export const STRIP_TOP = SETTLEMENT_FOOT + 24;
/**
 * Of the drawing of horizontal movement.
 *
 * Units: pixels. Valid: a constant. Source: [own].
 */
export const MOVEMENT_TOP = STRIP_TOP + SECTION.strip + 22;
/**
 * Of the drawing of horizontal movement.
 *
 * Units: pixels. Valid: a constant. Source: [own].
 */
export const MOVEMENT_FOOT = MOVEMENT_TOP + SECTION.movement;
/**
 * Of the whole drawing.
 *
 * Units: pixels. Valid: a constant. Source: [own].
 */
export const SECTION_HEIGHT = MOVEMENT_FOOT + 8;

/**
 * The scales of a section: along the wall in m, settlement down and movement up in mm.
 *
 * Units: m, mm and pixels. Valid: made by `sectionFrame`. Source: [own].
 */
export type SectionFrame = {
  readonly along: Scale;
  readonly down: Scale;
  readonly movement: Scale;
  readonly ticks: {
    readonly along: readonly number[];
    readonly down: readonly number[];
    readonly movement: readonly number[];
  };
};

const PIXELS_PER_TICK = 70;
/** Under it everything is drawn as if it were so much, so that noise does not fill the drawing. */
const LEAST_MM = 1;

/**
 * The scales on which a section is drawn, `width` pixels wide.
 *
 * Units: width pixels. Valid: at least one point. Source: [own].
 */
export function sectionFrame({ length, points }: WallSection, width: number): SectionFrame {
  const deepest = Math.max(
    LEAST_MM,
    ...points.map((one) => millimetresFromMetres(one.settlementHigh)),
  );
  const highest = Math.min(0, ...points.map((one) => millimetresFromMetres(one.settlementLow)));
  const moved = points.map(({ displacement }) => millimetresFromMetres(displacement));
  const widest = Math.max(LEAST_MM, ...moved.map(Math.abs));
  const span = width - SECTION.left - SECTION.right;
  return {
    along: linearScale([0, length], [SECTION.left, SECTION.left + span]),
    down: linearScale([highest, deepest * 1.04], [SECTION.top, SETTLEMENT_FOOT]),
    movement: linearScale([-widest, widest], [MOVEMENT_FOOT, MOVEMENT_TOP]),
    ticks: {
      along: niceTicks(0, length, Math.max(2, Math.floor(span / PIXELS_PER_TICK))),
      down: niceTicks(highest, deepest * 1.04, 5),
      movement: niceTicks(-widest, widest, 4),
    },
  };
}
