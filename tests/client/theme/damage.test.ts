// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { CATEGORIES } from '../../../shared/damage/categories.ts';
import { HATCH_TILE } from '../../../shared/presentation/damage-style.ts';
import { hatchPath, hatchTileSvg, hatchTileUrl } from '../../../src/theme/damage.ts';

describe('the hatches', () => {
  it('has a hatch of its own for every category but the first', () => {
    const paths = CATEGORIES.map(({ category }) => hatchPath(category));
    expect(paths[0]).toBe('');
    expect(new Set(paths).size).toBe(CATEGORIES.length);
  });
});

describe('hatchTileSvg', () => {
  it('draws a tile of any size from the same strokes', () => {
    const svg = hatchTileSvg(2, 32);
    expect(svg).toContain('width="32"');
    expect(svg).toContain(`viewBox="0 0 ${HATCH_TILE} ${HATCH_TILE}"`);
    expect(svg).toContain(hatchPath(2));
    expect(hatchTileSvg(0)).not.toContain('path');
  });

  it('is an address too', () => {
    const address = hatchTileUrl(3);
    expect(decodeURIComponent(address)).toBe(`data:image/svg+xml,${hatchTileSvg(3)}`);
  });
});
