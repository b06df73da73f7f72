import type { CrsAnswer } from '../../../shared/schemas/crs.ts';

function degrees(value: number, [positive, negative]: readonly [string, string]): string {
  return `${Math.abs(value).toFixed(1)}° ${value < 0 ? negative : positive}`;
}

/** Where a system is used, as "0.0° E to 6.0° E, 0.0° N to 84.0° N". */
export function boundsInWords([west, south, east, north]: CrsAnswer['bounds']): string {
  const across = [west, east].map((value) => degrees(value, ['E', 'W'])).join(' to ');
  const along = [south, north].map((value) => degrees(value, ['N', 'S'])).join(' to ');
  return `${across}, ${along}`;
}
