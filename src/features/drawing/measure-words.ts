import { footprintArea } from '../../../shared/building/footprint-area.ts';
import { formatFigure } from '../../../shared/presentation/field-words.ts';
import type { Parts } from './drafts/draft.ts';

/** A length between corners, to the centimetre. */
export function lengthWords(metres: number): string {
  return `${formatFigure('groundLevel', Number(metres.toFixed(2)))} m`;
}

/** The area of an outline, to a tenth. */
export function areaWords(parts: Parts): string {
  return `${formatFigure('area', Number(footprintArea(parts).toFixed(1)))} m²`;
}

const LEAST_PLACES = 2;
const MOST_PLACES = 3;

/** A coordinate as it is written, to the centimetre or, where it is finer, to the millimetre. */
export function coordinateText(value: number): string {
  const fine = value.toFixed(MOST_PLACES);
  const text = fine.endsWith('0') ? value.toFixed(LEAST_PLACES) : fine;
  return text.replace('-', '\u2212');
}
