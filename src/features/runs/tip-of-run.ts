import { CATEGORIES } from '../../../shared/damage/categories.ts';
import type { RunMap } from '../../../shared/schemas/run-map.ts';

function label(category: number | undefined): string {
  return CATEGORIES[category ?? 0]?.label ?? '';
}

function same(values: readonly (number | undefined)[]): boolean {
  return new Set(values).size === 1;
}

/** The categories of a building over the likely range, as `Category 0, 1 and 2: low, central, high`. */
export function rangeOfCategories(low: number, central: number, high: number): string {
  if (same([low, central, high])) return `Category ${label(central)} over the whole range`;
  return `Category ${label(low)} low, ${label(central)} central, ${label(high)} high`;
}

const MILLIMETRES = 1000;

/** A settlement in words. */
export function settlementWords(metres: number): string {
  return `${(metres * MILLIMETRES).toFixed(1)} mm`;
}

/** What is said of a building of a run beside the cursor; nothing of one that was not in it. */
export function tipOfRun(figures: RunMap): (buildingId: number) => readonly string[] {
  const places = new Map(figures.ids.map((id, k) => [id, k]));
  return (buildingId) => {
    const k = places.get(buildingId);
    if (k === undefined) return ['Not in this run'];
    const [low = -1, central = -1, high = -1] = [
      figures.low[k],
      figures.central[k],
      figures.high[k],
    ];
    const stage = figures.stage[k] ?? 0;
    return [
      central < 0 ? 'No category' : rangeOfCategories(low, central, high),
      `Settlement ${settlementWords(figures.settlement[k] ?? 0)}`,
      stage < 3 ? `Let go at stage ${stage}` : 'Stage 3',
    ];
  };
}
