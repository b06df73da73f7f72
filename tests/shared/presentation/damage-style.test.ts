import { describe, expect, it } from 'vitest';
import { CATEGORIES } from '../../../shared/damage/categories.ts';
import { DAMAGE } from '../../../shared/presentation/damage-style.ts';

function channel(hex: string, at: number): number {
  const value = parseInt(hex.slice(at, at + 2), 16) / 255;
  return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
}

function luminance(hex: string): number {
  return 0.2126 * channel(hex, 1) + 0.7152 * channel(hex, 3) + 0.0722 * channel(hex, 5);
}

function contrast(a: string, b: string): number {
  const [light = 0, dark = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (light + 0.05) / (dark + 0.05);
}

describe('the damage palette', () => {
  const styles = CATEGORIES.map(({ category }) => DAMAGE[category]);

  it('darkens with every category, so that a copy in greys reads alike', () => {
    const lights = styles.map(({ fill }) => luminance(fill));
    expect(lights).toEqual([...lights].sort((a, b) => b - a));
  });

  it('carries a number that can be read, inside an edge that can be seen', () => {
    for (const { fill, text, edge } of styles) {
      expect(contrast(fill, text)).toBeGreaterThan(4.5);
      expect(contrast(edge, '#F6F2E8')).toBeGreaterThan(3);
    }
  });
});
