import { tunnelsBeside, type TunnelsBeside } from '../../shared/assessment/tunnels-beside.ts';
import { CATEGORIES, type Category } from '../../shared/damage/categories.ts';
import type { OwnerFacts } from '../../shared/presentation/owner-words.ts';
import type { AlignmentDesign } from '../../shared/schemas/alignments.ts';
import type { FoundOfBuilding } from '../models/find-told.ts';

function categoryOf(number: number | null): Category | null {
  return CATEGORIES.find(({ category }) => category === number)?.category ?? null;
}

/** What an owner is told of a building, from what a run over a design found of it, with its tunnels. */
export function toldOfBuilding(
  found: FoundOfBuilding,
  design: AlignmentDesign,
): { readonly facts: OwnerFacts } & Pick<TunnelsBeside, 'axes'> {
  const ground = found.groundLevel ?? design.groundLevel;
  const { axes, depth, distance } = tunnelsBeside(design, found.parts, ground);
  const facts: OwnerFacts = {
    settlement: found.settlement,
    most: found.most,
    categoryLow: categoryOf(found.categoryLow),
    category: categoryOf(found.category),
    categoryHigh: categoryOf(found.categoryHigh),
    tunnels: axes.length,
    depth,
    distance,
  };
  return { facts, axes };
}
