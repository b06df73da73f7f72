/** The places in a result at which a number is not finite. */
export function notFinite(value: unknown, place = 'result'): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [`${place} is ${value}`];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) => notFinite(inner, `${place}.${key}`));
}
