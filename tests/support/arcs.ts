import { gridAbout } from './field-against-sinks.ts';
import type { ArcShape } from './sink-path.ts';

/** A bend of 1.8 radians, axis 20 m under datum where it begins and falling by `gradient`. */
export function bendOf(radius: number, gradient = 0): ArcShape {
  const toLevel = -20 - gradient * radius * 1.8;
  return { E: 0, N: 0, radius, fromAngle: 0.2, toAngle: 2, fromLevel: -20, toLevel };
}

/** Points over 80 m by 80 m about the middle of a bend. */
export function aboutBend(radius: number): Float64Array {
  return gridAbout([radius * Math.cos(1.1), radius * Math.sin(1.1)], 40, 13);
}
