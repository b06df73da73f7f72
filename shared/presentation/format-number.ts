const THIN_SPACE = '\u2009';
const MINUS = '\u2212';

/**
 * A count or figure with thin spaces between thousands and a true minus.
 *
 * Units: those of the value. Valid: finite. Source: [own].
 */
export function formatCount(value: number): string {
  const digits = String(Math.abs(value));
  const [whole = '', fraction] = digits.split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, THIN_SPACE);
  const sign = value < 0 ? MINUS : '';
  return fraction === undefined ? `${sign}${grouped}` : `${sign}${grouped}.${fraction}`;
}
