import { numberOf } from '../../lib/number-of.ts';

/** What people write a figure with; more only where fewer would mean another figure. */
const MOST_DIGITS = 6;
/** Apart by less than this, two figures are the same one. */
const SAME = 1e-11;

/** The shortest way to write a figure that is read as `meant` again. */
function written(value: number, meant: number, read: (text: string) => number): string {
  for (let digits = 1; digits <= MOST_DIGITS; digits += 1) {
    const text = String(Number(value.toPrecision(digits)));
    if (Math.abs(read(text) - meant) <= SAME * Math.abs(meant)) return text;
  }
  return String(value);
}

/** Metres as millimetres. */
export function fromMetres(metres: number): string {
  return written(metres * 1000, metres, toMetres);
}

/** A slope as the n of "1 in n". */
export function fromSlope(slope: number): string {
  return written(1 / slope, slope, toSlope);
}

/** What somebody wrote as a number; NaN where it is none. A comma is taken for a point. */
export function toNumber(text: string): number {
  return numberOf(text) ?? NaN;
}

/** Millimetres as metres. */
export function toMetres(millimetres: string): number {
  // through the text, so that no last bit of a division is kept
  return Number(`${toNumber(millimetres)}e-3`);
}

/** The n of "1 in n" as a slope. */
export function toSlope(n: string): number {
  return 1 / toNumber(n);
}
