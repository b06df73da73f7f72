const NUMBER = /^[+-]?(\d+([.,]\d*)?|[.,]\d+)([eE][+-]?\d+)?$/;

/** A number with a decimal point or comma; NaN for anything else. */
export function readNumber(text: string): number {
  const trimmed = text.trim();
  return NUMBER.test(trimmed) ? Number(trimmed.replace(',', '.')) : NaN;
}
