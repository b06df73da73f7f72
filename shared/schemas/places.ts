import { z } from 'zod';
import { LIMITS } from './limits.ts';

/**
 * A coordinate in the scheme's grid.
 *
 * Units: m. Valid: within LIMITS.coordinate of the grid's origin. Source: [own].
 */
export const coordinateSchema = z
  .number('Write a number.')
  .min(-LIMITS.coordinate)
  .max(LIMITS.coordinate);

/**
 * A chainage, the plan length from the first point of a line.
 *
 * Units: m. Valid: 0 to 1000 km; whether a line is so long is not its matter. Source: [own].
 */
export const chainageSchema = z.number('Write a number.').min(0).max(1_000_000);
