import type { PlanPoint, Segment } from '../../../shared/geometry/point.ts';
import { letterPlace, type PlanFrame } from '../../../shared/presentation/plan-frame.ts';
import type { Place } from '../pdf/trace.ts';

/** In pixels: of a letter's ring, and between the middles of two that do not touch. */
export const LETTER_RADIUS = 7.5;
const APART = 2 * LETTER_RADIUS + 1;
/** How many steps a letter may move outwards to stand clear. */
const MOST_STEPS = 6;

export type LetterSpot = { readonly wall: Place; readonly letter: Place };

function isClear([x, y]: Place, taken: readonly LetterSpot[]): boolean {
  return taken.every(({ letter }) => Math.hypot(letter[0] - x, letter[1] - y) >= APART);
}

/** Where the letters of walls stand: beside their walls, farther out where another stands there already. */
export function letterSpots(
  frame: Pick<PlanFrame, 'place'>,
  walls: readonly { readonly segment: Segment }[],
  middle: PlanPoint,
): readonly LetterSpot[] {
  const spots: LetterSpot[] = [];
  for (const { segment } of walls) {
    const { start, end } = segment;
    const wall = frame.place([(start[0] + end[0]) / 2, (start[1] + end[1]) / 2]);
    const [x, y] = letterPlace(frame, segment, middle);
    const steps = Array.from({ length: MOST_STEPS }, (_, k): Place => [
      wall[0] + (k + 1) * (x - wall[0]),
      wall[1] + (k + 1) * (y - wall[1]),
    ]);
    spots.push({ wall, letter: steps.find((place) => isClear(place, spots)) ?? [x, y] });
  }
  return spots;
}
