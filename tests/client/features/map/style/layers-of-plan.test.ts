// @vitest-environment node
import type { LayerSpecification } from 'maplibre-gl';
import { describe, expect, it } from 'vitest';
import { BASEMAP_LAYERS } from '../../../../../shared/schemas/basemap.ts';
import { BACKGROUND_LAYERS } from '../../../../../shared/schemas/background.ts';
import type { MapPlan } from '../../../../../src/features/map/map-plan.ts';
import { layersOfPlan } from '../../../../../src/features/map/style/layers-of-plan.ts';
import { MAP_COLOURS } from '../../../../../src/features/map/style/map-colours.ts';
import { sourcesOfPlan } from '../../../../../src/features/map/style/sources-of-plan.ts';
import { mapPlan, tileSet } from '../../../../support/map-plans.ts';

const DEMO = mapPlan({ basemap: tileSet(), buildings: tileSet() });
const ELSEWHERE = mapPlan({ background: tileSet({ bounds: null }), buildings: tileSet() });
const EMPTY = mapPlan();

function ids(plan: MapPlan): string[] {
  return layersOfPlan(plan).map(({ id }) => id);
}

function drawnFrom(layers: readonly LayerSpecification[], source: string): Set<string> {
  const drawn = layers.flatMap((layer) =>
    layer.type !== 'background' && layer.source === source ? [layer['source-layer'] ?? ''] : [],
  );
  return new Set(drawn);
}

function paperOf(plan: MapPlan): unknown {
  const [paper] = layersOfPlan(plan);
  return paper?.type === 'background' ? paper.paint?.['background-color'] : undefined;
}

describe.each([
  ['the demo', DEMO],
  ['a scheme elsewhere', ELSEWHERE],
  ['a scheme without anything', EMPTY],
])('the layers of %s', (_name, plan) => {
  const layers = layersOfPlan(plan);

  it('have each a name of their own', () => {
    expect(new Set(ids(plan)).size).toBe(layers.length);
  });

  it('draw from sources that are there, and leave none out', () => {
    const used = layers.flatMap((layer) => (layer.type === 'background' ? [] : [layer.source]));
    expect(new Set(used)).toEqual(new Set(Object.keys(sourcesOfPlan(plan))));
  });

  it('keep names above everything else', () => {
    const kinds = layers.map(({ type }) => type === 'symbol');
    expect(kinds).toEqual(kinds.toSorted());
  });
});

describe('layersOfPlan', () => {
  it('draws every layer of the demo map', () => {
    expect(drawnFrom(layersOfPlan(DEMO), 'basemap')).toEqual(new Set(BASEMAP_LAYERS));
  });

  it('draws every layer of an uploaded background', () => {
    expect(drawnFrom(layersOfPlan(ELSEWHERE), 'background')).toEqual(new Set(BACKGROUND_LAYERS));
  });

  it('lets the sea go on round the demo town and nowhere else', () => {
    expect(paperOf(DEMO)).toBe(MAP_COLOURS.water);
    expect(paperOf(ELSEWHERE)).toBe(MAP_COLOURS.land);
  });

  it('lays water, gardens, streets, harbour, bridges and buildings in this order', () => {
    const wanted = ['sea', 'land', 'gardens', 'streets', 'harbour', 'bridges', 'buildings'];
    expect(ids(DEMO).filter((id) => wanted.includes(id))).toEqual(wanted);
  });

  it('outlines what is selected in blue, over the edges of its neighbours', () => {
    const order = ids(DEMO);
    expect(order.indexOf('building-marks')).toBeGreaterThan(order.indexOf('building-edges'));
    const marks = JSON.stringify(layersOfPlan(DEMO).find(({ id }) => id === 'building-marks'));
    expect(marks).toContain(`["feature-state","selected"],false],"${MAP_COLOURS.select}"`);
  });
});

describe('what is drawn of a building by its state', () => {
  const byState = (plan: MapPlan): string[] =>
    layersOfPlan(plan).flatMap(({ id, paint = {} }) =>
      Object.entries(paint)
        .filter(([, value]) => JSON.stringify(value).includes('feature-state'))
        .map(([property]) => `${id} ${property}`),
    );

  it('is so in every plan that draws it: tiles on their way come from the plan before', () => {
    const plans = [
      DEMO,
      { ...DEMO, meant: new Set([1]) },
      { ...DEMO, shades: new Map([[1, 1]]) },
      { ...DEMO, rows: tileSet() },
    ];
    for (const plan of plans) {
      const all = new Set(plans.flatMap(byState));
      const drawn = layersOfPlan(plan).map(({ id }) => id);
      const expected = [...all].filter((one) => drawn.includes(one.split(' ')[0] ?? ''));
      expect(byState(plan).toSorted()).toEqual(expected.toSorted());
    }
    expect(byState(DEMO)).toContain('buildings fill-opacity');
  });
});

describe('sourcesOfPlan', () => {
  it('tells the map how far tiles go, so that it asks for none that are missing', () => {
    const { buildings } = sourcesOfPlan(DEMO);
    expect(buildings).toEqual({
      type: 'vector',
      tiles: [tileSet().url],
      bounds: [1.6, 54.7, 1.7, 54.8],
      minzoom: 13,
      maxzoom: 17,
    });
    expect(sourcesOfPlan(ELSEWHERE).background).not.toHaveProperty('bounds');
  });
});
