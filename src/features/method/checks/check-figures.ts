import type { CheckRow } from '../../../../shared/checks/check.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { formatSignificant } from '../../../../shared/presentation/significant.ts';

const MOST_DECIMALS = 16;
const TINY_DIGITS = 7;

/** One digit more than the tolerance tells apart, and than is published. */
function decimalsFor({ expected, tolerance }: CheckRow): number {
  const told = Math.ceil(-Math.log10(tolerance));
  const published = /\.(\d+)$/.exec(String(expected))?.[1]?.length ?? 0;
  return Math.min(MOST_DECIMALS, Math.max(0, told, published) + 1);
}

/** A computed figure, one digit further than can matter. */
export function computedFigure(row: CheckRow): string {
  const { computed } = row;
  if (!Number.isFinite(computed)) return 'no number';
  return computed.toFixed(decimalsFor(row)).replace('-', '\u2212');
}

/** A published figure as it is printed. */
export function publishedFigure({ expected }: CheckRow): string {
  const isTiny = String(expected).includes('e');
  return isTiny ? formatSignificant(expected, TINY_DIGITS) : formatCount(expected);
}

/** What lies between the two. */
export function differenceFigure({ computed, expected }: CheckRow): string {
  if (!Number.isFinite(computed)) return '–';
  return formatSignificant(computed - expected, 2);
}

/** How far apart they may be. */
export function toleranceFigure({ tolerance }: CheckRow): string {
  return formatSignificant(tolerance, 2);
}
