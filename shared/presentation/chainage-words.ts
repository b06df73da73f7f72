const KILOMETRE = 1000;

/**
 * A chainage as it is read along a line: kilometres, a plus and metres, as `2+645`.
 *
 * Units: m, rounded. Valid: ≥ 0. Source: [common].
 */
export function chainageWords(metres: number): string {
  const whole = Math.round(metres);
  const rest = String(whole % KILOMETRE).padStart(3, '0');
  return `${Math.floor(whole / KILOMETRE)}+${rest}`;
}
