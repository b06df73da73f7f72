import type { Block } from './block.ts';
import { blockIsNegligible } from './block-is-negligible.ts';
import type { GroundModel } from './ground-model.ts';
import type { Place } from './place.ts';

/**
 * A place with the blocks of drive that can move the ground there, whatever K in its range.
 *
 * Units: m. Valid: made by `siteOf` for one model. Source: [own].
 */
export type Site = { readonly place: Place; readonly blocks: readonly Block[] };

/**
 * Finds the blocks that matter at a place, once for every state of the ground. `culling` is off only
 * where a test asks what it leaves out.
 *
 * Units: m. Valid: what is left out changes settlement by less than CULLED_SETTLEMENT and curvature by
 * less than CULLED_CURVATURE. Source: [own].
 */
export function siteOf(model: GroundModel, place: Place, culling = true): Site {
  const { blocks, rules } = model;
  if (!culling) return { place, blocks };
  return {
    place,
    blocks: blocks.filter((block) => !blockIsNegligible(block, place, rules.depth, blocks.length)),
  };
}
