// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { CATEGORIES } from '../../../../../shared/damage/categories.ts';
import {
  addDamageImages,
  damageImage,
  damageName,
} from '../../../../../src/features/map/style/damage-images.ts';
import { layersOfPlan } from '../../../../../src/features/map/style/layers-of-plan.ts';
import { pixelsPerMetre, zoomOfScale } from '../../../../../src/features/map/style/metres-wide.ts';
import { mapPlan, tileSet } from '../../../../support/map-plans.ts';

/** The least category has its colour alone. */
const HATCHED = [1, 2, 3, 4] as const;
const PLAN = mapPlan({ buildings: tileSet(), shades: new Map() });

/** How light a tile is on the whole, 0 to 255. */
function lightness(category: (typeof CATEGORIES)[number]['category']): number {
  const { data } = damageImage(category);
  const shares = [0.2126, 0.7152, 0.0722, 0];
  const sum = data.reduce((total, value, k) => total + value * (shares[k % 4] ?? 0), 0);
  return (sum * 4) / data.length;
}

describe('buildings by category', () => {
  const layers = layersOfPlan(PLAN);

  it('are drawn between their plain ground and their edges, a layer for each', () => {
    const ids = layers.map(({ id }) => id);
    const first = ids.indexOf('buildings');
    expect(ids.slice(first, first + 7)).toEqual([
      'buildings',
      ...HATCHED.map((category) => `category-${category}`),
      'building-far-edges',
      'category-edges',
    ]);
  });

  it('use the hatches that the map is given', () => {
    const names: string[] = [];
    addDamageImages({ addImage: (name) => names.push(name) });
    const asked = layers.flatMap((layer) =>
      layer.type === 'fill' && layer.paint?.['fill-pattern'] !== undefined
        ? [layer.paint['fill-pattern']]
        : [],
    );
    expect(names).toEqual(expect.arrayContaining(asked));
    expect(asked).toEqual(HATCHED.map(damageName));
  });

  it('have their number inside from two pixels a metre on', () => {
    const numbers = layers.filter(({ id }) => id.startsWith('shade-number'));
    expect(numbers.length).toBeGreaterThan(CATEGORIES.length);
    for (const { minzoom = 0 } of numbers) {
      expect(pixelsPerMetre(minzoom, PLAN.latitude)).toBeCloseTo(2, 6);
      expect(minzoom).toBe(zoomOfScale(2, PLAN.latitude));
    }
  });

  it('are not asked for without a run', () => {
    const ids = layersOfPlan(mapPlan({ buildings: tileSet() })).map(({ id }) => id);
    expect(ids.filter((id) => id.startsWith('category'))).toEqual([]);
  });
});

describe('the hatch of a category', () => {
  it('is darker than the one before', () => {
    const steps = CATEGORIES.map(({ category }) => lightness(category));
    expect(steps).toEqual(steps.toSorted((a, b) => b - a));
    expect(new Set(steps).size).toBe(CATEGORIES.length);
  });

  it('runs on from tile to tile', () => {
    const { data, width } = damageImage(1);
    const at = (x: number, y: number) => data[((y % width) * width + (x % width)) * 4];
    // a stroke at half a right angle meets itself beyond every side
    for (let k = 0; k < width; k += 1) expect(at(k, width - 1 - k)).toBe(at(0, width - 1));
  });
});
