import { millimetresFromMetres } from '../units/millimetres-from-metres.ts';
import { cornersOnBuildings, type Outline } from './building-outlines.ts';
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

/**
 * What a contour says, and a place of it.
 *
 * Units: mm. Valid: on the sheet. Source: [own].
 */
export type ContourLabel = { readonly words: string; readonly at: Spot };

/** The place of a label that is wanted at a distance along a stretch. */
function placeAt(
  stretch: readonly Spot[],
  spots: ReturnType<typeof spotsAlong>,
  wanted: number,
): Spot {
  const nearest = spots.reduce<(typeof spots)[number] | undefined>(
    (best, spot) =>
      best === undefined || Math.abs(spot.distance - wanted) < Math.abs(best.distance - wanted)
        ? spot
        : best,
    undefined,
  );
  return nearest?.box.middle ?? stretch[Math.floor(stretch.length / 2)] ?? [0, 0];
}

type Drawn = {
  readonly window: Rectangle;
  readonly measure: Measure;
  /** Outlines of the buildings that labels keep clear of, on paper. */
  readonly outlines: readonly Outline[];
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
  const under = cornersOnBuildings(outlines);
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
          rank: under(box) * 1000 + Math.abs(distance - middle),
        }));
        ranked.sort((a, b) => a.rank - b.rank);
        return {
          what: { words, at: placeAt(stretch, spots, middle) },
          spots: ranked.map(({ box }) => box),
        };
      });
    });
  });
}
