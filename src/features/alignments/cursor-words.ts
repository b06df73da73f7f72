import type { GroundSurface } from '../../../shared/ground/ground-surface.ts';
import { FIELD } from '../../../shared/ground/kernel.ts';
import type { GridPlace } from '../map/place/grid-projection.ts';
import { chainageWords } from '../../../shared/presentation/chainage-words.ts';
import type { PlaceOnLine } from './place-on-line.ts';

/** Farther off than this a place has nothing to do with the line, in m. */
export const BESIDE_LINE = 250;

const MILLIMETRES = 1000;

function signed(value: number): string {
  const text = Math.abs(value).toFixed(1);
  if (text === '0.0') return text;
  return `${value < 0 ? '\u2212' : '+'}${text}`;
}

/** What is said of a place beside a line: chainage, offset to the left, and central settlement. */
export function cursorWords(
  { chainage, offset }: PlaceOnLine,
  place: GridPlace,
  surface: GroundSurface | null,
): readonly string[] {
  if (Math.abs(offset) > BESIDE_LINE) return [];
  const settlement = surface?.at(place)?.[FIELD.settlement];
  return [
    `Chainage ${chainageWords(chainage)}`,
    `Offset ${signed(offset)} m`,
    ...(settlement === undefined ? [] : [`S ${(settlement * MILLIMETRES).toFixed(1)} mm`]),
  ];
}
