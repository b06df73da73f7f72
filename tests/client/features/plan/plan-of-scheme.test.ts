// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { planOfScheme, type PlanSources } from '../../../../src/features/plan/plan-of-scheme.ts';

function sources(overrides: Partial<PlanSources> = {}): PlanSources {
  return {
    scheme: { id: 'a', registerVersion: 4, backgroundVersion: 9 },
    extent: {
      bounds: [1.63, 54.75, 1.65, 54.76],
      home: [1.63, 54.75, 1.65, 54.76],
      crs: 32631,
      from: 'buildings',
    },
    basemap: {
      tiles: ['/tiles/{z}/{x}/{y}.pbf'],
      bounds: [1.62, 54.74, 1.66, 54.77],
      minzoom: 11,
      maxzoom: 16,
    },
    hasBackground: false,
    origin: 'http://127.0.0.1:4600',
    ...overrides,
  };
}

describe('planOfScheme', () => {
  it('lays the demo map under buildings that stand on it', () => {
    const { basemap, buildings, background } = planOfScheme(sources());
    expect(basemap?.url).toBe('http://127.0.0.1:4600/tiles/{z}/{x}/{y}.pbf');
    expect(buildings?.url).toBe(
      'http://127.0.0.1:4600/api/schemes/a/tiles/buildings/4/{z}/{x}/{y}.pbf',
    );
    expect(background).toBeNull();
  });

  it('asks for tiles of buildings only where there are buildings', () => {
    const { buildings } = planOfScheme(sources());
    expect(buildings).toMatchObject({ bounds: [1.63, 54.75, 1.65, 54.76], minzoom: 13 });
  });

  it.each([
    ['elsewhere', { bounds: [10, 50, 10.1, 50.1], crs: 25832, from: 'buildings' }],
    [
      'half outside',
      {
        bounds: [1.63, 54.75, 1.67, 54.76],
        crs: 32631,
        from: 'buildings',
      },
    ],
    [
      'without buildings',
      {
        bounds: [1.63, 54.75, 1.65, 54.76],
        crs: 32631,
        from: 'crs',
      },
    ],
  ] as const)('keeps the demo map from under a scheme %s', (_where, extent) => {
    const bounds: [number, number, number, number] = [...extent.bounds];
    expect(
      planOfScheme(sources({ extent: { ...extent, bounds, home: bounds } })).basemap,
    ).toBeNull();
  });

  it('shows what was uploaded, and no buildings where there are none', () => {
    const extent = { ...sources().extent, from: 'background' as const };
    const plan = planOfScheme(sources({ extent, basemap: undefined, hasBackground: true }));
    expect(plan.buildings).toBeNull();
    expect(plan.background).toMatchObject({
      url: 'http://127.0.0.1:4600/api/schemes/a/tiles/background/9/{z}/{x}/{y}.pbf',
      bounds: null,
    });
  });

  it('takes widths in metres in the middle of the scheme', () => {
    expect(planOfScheme(sources()).latitude).toBeCloseTo(54.755, 9);
  });
});
