import { beamStrains, type DeepBeam } from '../../../shared/building/deep-beam.ts';
import type { StrainedZone } from '../../../shared/building/strained-zone.ts';
import type { Category } from '../../../shared/damage/categories.ts';
import { categoryOfStrain } from '../../../shared/damage/category-of-strain.ts';
import {
  numberPlaces,
  type InteractionFrame,
} from '../../../shared/presentation/interaction-frame.ts';
import type { Place } from '../pdf/trace.ts';

/** In pixels: between a number and a point that would lie under it, and a step along the band of a category. */
const [CLEAR, STEP_ACROSS, STEP_DOWN] = [15, 14, 8];
const STEPS = [0, 1, -1, 2, -2, 3, -3, 4, -4];

type Chart = {
  readonly zone: StrainedZone;
  readonly beam: DeepBeam;
  readonly frame: InteractionFrame;
};

function categoryAt({ zone, beam, frame }: Chart, [x, y]: Place): Category {
  const { from, to, most, across, up } = frame;
  const strain = from + ((x - across(from)) * (to - from)) / (across(to) - across(from));
  const ratio = ((y - up(0)) * most) / (up(most) - up(0));
  return categoryOfStrain(beamStrains(zone.mode, beam, ratio, strain).strain);
}

function isInside({ from, to, most, across, up }: InteractionFrame, [x, y]: Place): boolean {
  return (
    x > across(from) + CLEAR && x < across(to) - CLEAR && y > up(most) + CLEAR && y < up(0) - CLEAR
  );
}

/** Where the number of each category stands on its hatch: clear of the points where there is room. */
export function numberSpots(chart: Chart, points: readonly Place[]) {
  const { zone, beam, frame } = chart;
  return numberPlaces(zone, beam, frame).map(({ category, at }) => {
    const [x, y] = [frame.across(at.horizontalStrain), frame.up(at.deflectionRatio)];
    const isClear = (place: Place) =>
      isInside(frame, place) &&
      categoryAt(chart, place) === category &&
      points.every((point) => Math.hypot(point[0] - place[0], point[1] - place[1]) >= CLEAR);
    const spots = STEPS.map((k): Place => [x + k * STEP_ACROSS, y + k * STEP_DOWN]);
    return { category, place: spots.find(isClear) ?? ([x, y] as const) };
  });
}
