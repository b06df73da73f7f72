import { footprintSchema } from '../../shared/schemas/building-fields.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import type { KnownBuilding } from '../models/known-buildings.ts';
import { cleanRings } from './clean-rings.ts';
import { footprintHash } from './footprint-hash.ts';
import { isSameFootprint } from './same-footprint.ts';

/** Where the outline that the last file gave stands among what it said, when the register has another. */
const OUTLINE = 'outline';

type Imported = KnownBuilding['imported'];

function outlineIn({ [OUTLINE]: text }: Imported): FootprintRings[] {
  if (typeof text !== 'string') return [];
  return [footprintSchema.parse(JSON.parse(text))];
}

/**
 * Whether a footprint is the one that the last file gave a building whose footprint is another by now, but
 * for what a format's figures round away. `earlier` are those that the building had before.
 */
export function isToldBefore(
  footprint: FootprintRings,
  { imported }: KnownBuilding,
  earlier: readonly FootprintRings[],
): boolean {
  const told = [...outlineIn(imported), ...earlier]
    .map((rings) => cleanRings(rings))
    .find((rings) => rings !== undefined && footprintHash(rings) === imported.footprint);
  return told !== undefined && isSameFootprint(told, footprint);
}

/** What a file has said with its outline, which stands nowhere else when the register keeps its own. */
export function withOutline(said: Imported, footprint: FootprintRings): Imported {
  return { ...said, [OUTLINE]: JSON.stringify(footprint) };
}
