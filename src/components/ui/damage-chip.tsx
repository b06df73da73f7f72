import { CATEGORIES, type Category } from '../../../shared/damage/categories.ts';
import { HatchSwatch } from './hatch-swatch.tsx';

/** A damage category: hatch, number and, where there is room, its name. */
export function DamageChip({
  category,
  named = false,
}: {
  readonly category: Category;
  readonly named?: boolean;
}) {
  const row = CATEGORIES[category];
  if (row === undefined) return null;
  return (
    <span className="inline-flex items-center gap-1.5 align-middle font-semibold whitespace-nowrap">
      <HatchSwatch category={category} />
      <span className="sr-only">Category </span>
      {row.label}
      {named ? (
        <span className="font-normal text-ink-2">{row.name}</span>
      ) : (
        <span className="sr-only">, {row.name}</span>
      )}
    </span>
  );
}
