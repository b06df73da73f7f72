import { percentFromRatio } from '../../../shared/units/percent-from-ratio.ts';

/** A figure with so many places and a true minus. */
export function figureWords(value: number, places: number): string {
  return value.toFixed(places).replace('-', '\u2212');
}

/** A ratio in per cent, without the sign that stands in the head of its column. */
export function percentFigure(ratio: number, places: number): string {
  return figureWords(percentFromRatio(ratio), places);
}
