import { pointInPolygon } from '../geometry/point-in-polygon.ts';
import { millimetresFromMetres } from '../units/millimetres-from-metres.ts';
import { labelCorners, type LabelBox } from './label-box.ts';
import type { Measure, Rectangle, Spot } from './marks.ts';
import type { Wanted } from './place-labels.ts';
import { spotsAlong } from './spots-along.ts';
import { stretchesIn } from './stretches-in.ts';

/**
 * The size of the figures on contours.
 *
 * Units: points of print. Valid: a constant. Source: [own].
 */
export const CONTOUR_SIZE = 7;

/** A contour is labelled once in so many mm of it. */
const EVERY = 130;

/** How many corners of a label, and its middle, lie on buildings. */
function onBuildings(box: LabelBox, outlines: readonly (readonly (readonly Spot[])[])[]): number {
  const points = [box.middle, ...labelCorners(box)];
  return points.filter((point) => outlines.some((rings) => pointInPolygon(point, rings))).length;
}

/**
 * What a contour says, and a place of it.
 *
 * Units: mm. Valid: on the sheet. Source: [own].
 */
export type ContourLabel = { readonly words: string; readonly at: Spot };

function placeOn(stretch: readonly Spot[]): Spot {
  return stretch[Math.floor(stretch.length / 2)] ?? [0, 0];
}

type Drawn = {
  readonly window: Rectangle;
  readonly measure: Measure;
  /** Outlines of the buildings that labels keep clear of, on paper. */
  readonly outlines: readonly (readonly (readonly Spot[])[])[];
};

/**
 * The labels that contours want: one on every stretch of each, more on a long one, clear of buildings where
 * there is such a place.
 *
 * Units: levels m, lines mm. Valid: contours on paper. Source: [own].
 */
export function contourLabels(
  contours: readonly { readonly level: number; readonly line: readonly Spot[] }[],
  { window, measure, outlines }: Drawn,
): Wanted<ContourLabel>[] {
  return contours.flatMap(({ level, line }) => {
    const words = `${millimetresFromMetres(level)} mm`;
    const size = { wide: measure(words, CONTOUR_SIZE, false) + 1.6, tall: 3 };
    return stretchesIn(window, line).flatMap((stretch): Wanted<ContourLabel>[] => {
      const spots = spotsAlong(stretch, size);
      const last = spots.at(-1)?.distance ?? 0;
      const count = Math.max(1, Math.round(last / EVERY));
      return Array.from({ length: count }, (_, k) => {
        const middle = ((k + 0.5) / count) * last;
        const own = spots.filter(({ distance }) => Math.abs(distance - middle) <= last / count / 2);
        const ranked = own.map(({ box, distance }) => ({
          box,
          rank: onBuildings(box, outlines) * 1000 + Math.abs(distance - middle),
        }));
        ranked.sort((a, b) => a.rank - b.rank);
        return { what: { words, at: placeOn(stretch) }, spots: ranked.map(({ box }) => box) };
      });
    });
  });
}
