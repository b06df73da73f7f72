import { formatCount } from './format-number.ts';

const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';
/** Outside of these a figure is written with a power of ten. */
const [LEAST, MOST] = [1e-3, 1e7];

function power(exponent: number): string {
  const digits = String(Math.abs(exponent)).replace(/\d/g, (digit) =>
    SUPERSCRIPTS.charAt(Number(digit)),
  );
  return `10${exponent < 0 ? '⁻' : ''}${digits}`;
}

/**
 * A figure to so many significant digits, very small and very large ones with a power of ten.
 *
 * Units: those of the value. Valid: finite; digits from 1 to 100. Source: [own].
 */
export function formatSignificant(value: number, digits: number): string {
  const rounded = Number(value.toPrecision(digits));
  const size = Math.abs(rounded);
  if (size === 0 || (size >= LEAST && size < MOST)) return formatCount(rounded);
  const [mantissa = '', exponent = ''] = rounded.toExponential().split('e');
  return `${formatCount(Number(mantissa))}\u2009×\u2009${power(Number(exponent))}`;
}
