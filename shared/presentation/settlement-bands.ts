import { CONTOUR_LEVELS } from '../ground/settlement-contours.ts';
import { millimetresFromMetres } from '../units/millimetres-from-metres.ts';

/**
 * The number of the band of a settlement among the levels that contours are drawn for; −1 below the least.
 *
 * Units: m. Valid: any settlement. Source: [own].
 */
export function bandOf(settlement: number): number {
  return CONTOUR_LEVELS.findLastIndex((level) => settlement >= level);
}

/**
 * A band of settlement in words, as `5 to 10 mm`.
 *
 * Units: a number of bandOf. Valid: 0 and up. Source: [own].
 */
export function bandWords(band: number): string {
  const [from = 0, to] = [CONTOUR_LEVELS[band], CONTOUR_LEVELS[band + 1]].map((level) =>
    level === undefined ? undefined : Math.round(millimetresFromMetres(level)),
  );
  return to === undefined ? `${from} mm and more` : `${from} to ${to} mm`;
}
