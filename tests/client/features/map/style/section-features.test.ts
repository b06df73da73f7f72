import { expect, it } from 'vitest';
import { shapesOfShafts } from '../../../../../src/features/alignments/line-shapes.ts';
import type { SectionShape } from '../../../../../src/features/map/map-line.ts';
import { createGridProjection } from '../../../../../src/features/map/place/grid-projection.ts';
import { layersOfPlan } from '../../../../../src/features/map/style/layers-of-plan.ts';
import { lineFeatures } from '../../../../../src/features/map/style/line-features.ts';

const PROJECTION = createGridProjection('+proj=utm +zone=31 +datum=WGS84 +units=m +no_defs');

it('the mark of a section is a line with its name, over the line that it crosses', () => {
  const places = [[500_000, 6_080_000], [500_000, 6_080_040]] as const; // prettier-ignore
  const shapes: SectionShape[] = [
    { kind: 'mark', places },
    { kind: 'name', place: places[1], text: 'Section 2+645' },
  ];
  const { features } = lineFeatures(PROJECTION, shapes);
  expect(features.map(({ properties, geometry }) => [properties, geometry.type])).toEqual([
    [{ kind: 'mark' }, 'LineString'],
    [{ kind: 'name', text: 'Section 2+645' }, 'Point'],
  ]);
  const ids = layersOfPlan({
    ...{ latitude: 55, basemap: null, background: null, buildings: null },
    hasLine: true,
  }).map(({ id }) => id);
  expect(ids.indexOf('section-mark')).toBeGreaterThan(ids.indexOf('line-axes'));
  expect(ids).toContain('section-name');
});

it('a shaft is a mark with its name', () => {
  const shapes = shapesOfShafts([
    { name: 'East shaft', east: 500_000, north: 6_080_000, source: 'Drawing 12' },
  ]);
  const [feature] = lineFeatures(PROJECTION, shapes).features;
  expect([feature?.properties, feature?.geometry.type]).toEqual([
    { kind: 'shaft', text: 'East shaft' },
    'Point',
  ]);
  const ids = layersOfPlan({
    ...{ latitude: 55, basemap: null, background: null, buildings: null },
    hasLine: true,
  }).map(({ id }) => id);
  expect(ids).toEqual(expect.arrayContaining(['line-shafts', 'line-shaft-names']));
});
