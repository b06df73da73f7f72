import type { Metres, Millimetres } from './quantity.ts';

/**
 * A length for people to read.
 *
 * Units: m → mm. Valid: any finite length. Source: [own].
 */
export function millimetresFromMetres(length: Metres): Millimetres {
  return Number(length) * 1000;
}
