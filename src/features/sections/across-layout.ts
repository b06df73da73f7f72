import { longSection } from '../../../shared/assessment/long-section.ts';
import type { AlignmentDesign } from '../../../shared/schemas/alignments.ts';
import { linearScale, type Scale } from '../../../shared/presentation/linear-scale.ts';
import { trueScale } from '../../../shared/presentation/true-scale.ts';
import { reachOfDesign } from './reach-of-design.ts';

/** Room round a drawing for its ticks, in pixels. */
const ROOM = { left: 46, right: 46, top: 4, bottom: 22 };
/** What is seen above the ground and below the invert at least, in metres. */
const [ABOVE, BELOW] = [12, 2];

/** A drawing across the line: one scale for widths, heights and levels. */
export type AcrossLayout = {
  readonly width: number;
  readonly height: number;
  /** Edges of the drawing within its room. */
  readonly frame: { readonly left: number; readonly right: number; readonly top: number; readonly bottom: number };
  readonly denominator: number;
  readonly pixelsPerMetre: number;
  /** To either side, in metres. */
  readonly halfWidth: number;
  readonly ground: number;
  /** Offsets to the left stand at the left: one looks up the line. */
  readonly x: Scale;
  readonly y: Scale;
}; // prettier-ignore

/** Lays out sections across a line; all along it they have the same scale. */
export function acrossLayout(design: AlignmentDesign, width: number, height: number): AcrossLayout {
  const frame = {
    left: ROOM.left,
    right: width - ROOM.right,
    top: ROOM.top,
    bottom: height - ROOM.bottom,
  };
  const [across, down] = [frame.right - frame.left, frame.bottom - frame.top];
  const lowest = Math.min(...longSection(design).map(({ invert }) => invert));
  const tall = ABOVE + Math.max(0, design.groundLevel - lowest) + BELOW;
  const most = Math.min(down / tall, across / (2 * reachOfDesign(design)));
  const { denominator, pixelsPerMetre } = trueScale(most);
  const halfWidth = across / 2 / pixelsPerMetre;
  const spare = down - tall * pixelsPerMetre;
  const ground = frame.top + ABOVE * pixelsPerMetre + spare / 2;
  const middle = (frame.left + frame.right) / 2;
  return {
    ...{ width, height, frame, denominator, pixelsPerMetre, halfWidth, ground },
    x: linearScale([0, 1], [middle, middle - pixelsPerMetre]),
    y: linearScale([design.groundLevel, design.groundLevel + 1], [ground, ground - pixelsPerMetre]),
  };
}
