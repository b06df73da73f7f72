const DIGITS = 12;

/** A figure as people write it, without the last bits of its arithmetic. */
function written(value: number): string {
  return String(Number(value.toPrecision(DIGITS)));
}

/** Metres as millimetres. */
export function fromMetres(metres: number): string {
  return written(metres * 1000);
}

/** A slope as the n of "1 in n". */
export function fromSlope(slope: number): string {
  return written(1 / slope);
}

/** What somebody wrote as a number; NaN where it is none. A comma is taken for a point. */
export function toNumber(text: string): number {
  const trimmed = text.trim().replace(',', '.').replace('−', '-');
  return trimmed === '' ? NaN : Number(trimmed);
}

/** Millimetres as metres. */
export function toMetres(millimetres: string): number {
  return Number((toNumber(millimetres) / 1000).toPrecision(DIGITS));
}

/** The n of "1 in n" as a slope. */
export function toSlope(n: string): number {
  return Number((1 / toNumber(n)).toPrecision(DIGITS));
}
