// @vitest-environment node
import fc from 'fast-check';
import type { LayerSpecification } from 'maplibre-gl';
import { describe, expect, it } from 'vitest';
import {
  layerChanges,
  type LayerChange,
} from '../../../../../src/features/map/controller/layer-changes.ts';
import { holds } from '../../../../support/property.ts';

type FillLayer = Extract<LayerSpecification, { type: 'fill' }>;

function fill(id: string, overrides: Partial<FillLayer> = {}): FillLayer {
  return { id, type: 'fill', source: 'a', 'source-layer': id, ...overrides };
}

/** The order of layers that changes lead to, as a map would carry them out. */
function carriedOut(before: readonly LayerSpecification[], changes: readonly LayerChange[]) {
  const order = before.map(({ id }) => id);
  function place(id: string, above: string | undefined): void {
    if (above !== undefined && !order.includes(above)) throw new Error(`There is no ${above}.`);
    order.splice(above === undefined ? order.length : order.indexOf(above), 0, id);
  }
  for (const change of changes) {
    if (change.kind === 'add') place(change.layer.id, change.before);
    if (change.kind === 'remove') order.splice(order.indexOf(change.id), 1);
    if (change.kind === 'move') {
      order.splice(order.indexOf(change.id), 1);
      place(change.id, change.before);
    }
  }
  return order;
}

describe('layerChanges', () => {
  it('does nothing where nothing changed', () => {
    const layers = [fill('a', { paint: { 'fill-color': '#fff' } }), fill('b')];
    expect(layerChanges(layers, structuredClone(layers))).toEqual([]);
  });

  it('sets only the properties that differ, and takes back those that are gone', () => {
    const before = fill('a', { paint: { 'fill-color': '#fff', 'fill-opacity': 0.5 } });
    const after = fill('a', {
      paint: { 'fill-color': '#000' },
      layout: { visibility: 'none' },
      filter: ['has', 'name'],
      minzoom: 14,
    });
    expect(layerChanges([before], [after])).toEqual([
      { kind: 'paint', id: 'a', name: 'fill-color', value: '#000' },
      { kind: 'paint', id: 'a', name: 'fill-opacity', value: undefined },
      { kind: 'layout', id: 'a', name: 'visibility', value: 'none' },
      { kind: 'filter', id: 'a', filter: ['has', 'name'] },
      { kind: 'zooms', id: 'a', least: 14, most: 24 },
    ]);
    expect(layerChanges([after], [before])).toContainEqual({
      kind: 'filter',
      id: 'a',
      filter: null,
    });
  });

  it('puts a new layer where it belongs', () => {
    const [a, b, c] = [fill('a'), fill('b'), fill('c')];
    expect(layerChanges([a, c], [a, b, c])).toEqual([{ kind: 'add', layer: b, before: 'c' }]);
    expect(layerChanges([a, b], [a, b, c])).toEqual([{ kind: 'add', layer: c, before: undefined }]);
  });

  it('makes a layer anew that draws from elsewhere', () => {
    const after = fill('a', { source: 'b' });
    expect(layerChanges([fill('a')], [after])).toEqual([
      { kind: 'remove', id: 'a' },
      { kind: 'add', layer: after, before: undefined },
    ]);
  });

  it('makes layers anew whose source is', () => {
    const layer = fill('a');
    expect(layerChanges([layer], [layer], new Set(['a'])).map(({ kind }) => kind)).toEqual([
      'remove',
      'add',
    ]);
  });

  it('leads from any layers to any others', () => {
    const names = fc.uniqueArray(fc.constantFrom('a', 'b', 'c', 'd', 'e', 'f', 'g', 'h'), {
      maxLength: 8,
    });
    holds(fc.tuple(names, names), ([from, to]) => {
      const [before, after] = [from.map((id) => fill(id)), to.map((id) => fill(id))];
      expect(carriedOut(before, layerChanges(before, after))).toEqual(to);
    });
  });
});
