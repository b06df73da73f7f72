import { CATEGORIES, type Category } from '../../../shared/damage/categories.ts';
import { categoryLabel } from '../../../shared/presentation/bracket-words.ts';
import { FIRST_SHADE } from '../map/shades.ts';
import type { End, Shading } from '../runs/shades-of-run.ts';
import type { CutBuilding } from './cut-buildings.ts';

/** What the map colours buildings by, and at which value. */
export type ShownRun = { readonly shading: Shading | null; readonly end: End };

/** A building on a section with the category that the map shows of it; null where it shows none. */
export type ShownBuilding = CutBuilding & { readonly category: Category | null };

/** Buildings with the categories that the map shows; all without one where it is not coloured by category. */
export function withCategories(
  buildings: readonly CutBuilding[],
  shading: Shading | null,
): readonly ShownBuilding[] {
  const shades = shading?.by === 'category' ? shading.shades : null;
  return buildings.map((building) => {
    const shade = shades?.get(building.id);
    const row = shade === undefined ? undefined : CATEGORIES[shade - FIRST_SHADE.category];
    return { ...building, category: row?.category ?? null };
  });
}

/** The number of a building's category, as it is written everywhere; null where it has none. */
export function labelOf({ category }: ShownBuilding): string | null {
  return category === null ? null : categoryLabel(category);
}
