import { drivesOfDesign } from '../assessment/drives-of-design.ts';
import { offsetPolyline } from '../geometry/offset-polyline.ts';
import type { SpacePoint } from '../geometry/point.ts';
import { MethodError } from '../method-error.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import type { ChainageTick } from './chainage-marks.ts';
import type { GroundFrame } from './ground-frame.ts';
import { lineMark, type Mark, type Spot, type Stroke } from './marks.ts';

/**
 * How the axis of a drive is drawn.
 *
 * Units: mm. Valid: read only. Source: [own].
 */
export const DRIVE_AXIS: Stroke = { ink: 'ink', width: 0.42, dash: [4, 1, 0.8, 1] };

/**
 * How the edges of a drive are drawn.
 *
 * Units: mm. Valid: read only. Source: [own].
 */
export const DRIVE_EDGE: Stroke = { ink: 'ink', width: 0.22, dash: [0.4, 0.7] };

const TICK: Stroke = { ink: 'ink', width: 0.25 };
/** How far a tick reaches to either side of the line, in mm. */
const REACH = 3.2;

function onPaper({ place }: GroundFrame, axis: readonly SpacePoint[]): Spot[] {
  return axis.map(([e, n]) => place([e, n]));
}

/** The edge of a drive; where a bend is tighter than its radius there is none. */
function edgeOf(axis: readonly SpacePoint[], offset: number): readonly SpacePoint[] {
  try {
    return offsetPolyline(axis, offset);
  } catch (error) {
    if (error instanceof MethodError) return [];
    throw error;
  }
}

/**
 * The drives of a design on paper: each with its axis and its edges.
 *
 * Units: mm. Valid: throws as `drivesOfDesign`. Source: [own].
 */
export function driveMarks(frame: GroundFrame, design: AlignmentDesign): Mark[] {
  return drivesOfDesign(design).flatMap(({ axis, diameter }): Mark[] => [
    ...[diameter / 2, -diameter / 2].flatMap((offset) => {
      const edge = edgeOf(axis, offset);
      return edge.length === 0 ? [] : [lineMark(onPaper(frame, edge), DRIVE_EDGE)];
    }),
    lineMark(onPaper(frame, axis), DRIVE_AXIS),
  ]);
}

/**
 * The strokes across the line at round chainages.
 *
 * Units: mm. Valid: any ticks. Source: [own].
 */
export function tickMarks(ticks: readonly ChainageTick[]): Mark[] {
  return ticks.map(({ at: [x, y], along: [c, s] }) =>
    lineMark([[x - s * REACH, y + c * REACH], [x + s * REACH, y - c * REACH]], TICK),
  ); // prettier-ignore
}
