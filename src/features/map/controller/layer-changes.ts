import type { FilterSpecification, LayerSpecification } from 'maplibre-gl';
import { isSame } from './is-same.ts';

/** One thing to do to the layers of a map; `before` names the layer above. */
export type LayerChange =
  | { readonly kind: 'remove'; readonly id: string }
  | { readonly kind: 'add'; readonly layer: LayerSpecification; readonly before: string | undefined }
  | { readonly kind: 'move'; readonly id: string; readonly before: string | undefined }
  | { readonly kind: 'paint' | 'layout'; readonly id: string; readonly name: string; readonly value: unknown }
  | { readonly kind: 'filter'; readonly id: string; readonly filter: FilterSpecification | null }
  | { readonly kind: 'zooms'; readonly id: string; readonly least: number; readonly most: number }; // prettier-ignore

const ALL_ZOOMS = { least: 0, most: 24 };

type Properties = Readonly<Record<string, unknown>>;

function sourceOf(layer: LayerSpecification): readonly unknown[] {
  return layer.type === 'background' ? [] : [layer.source, layer['source-layer']];
}

function filterOf(layer: LayerSpecification): FilterSpecification | null {
  return layer.type === 'background' ? null : (layer.filter ?? null);
}

/** Whether a layer can become another by setting its properties. */
function isSameLayer(a: LayerSpecification, b: LayerSpecification): boolean {
  return a.type === b.type && isSame(sourceOf(a), sourceOf(b));
}

function propertyChanges(
  id: string,
  kind: 'paint' | 'layout',
  before: Properties = {},
  after: Properties = {},
): LayerChange[] {
  const names = new Set([...Object.keys(before), ...Object.keys(after)]);
  return [...names]
    .filter((name) => !isSame(before[name], after[name]))
    .map((name) => ({ kind, id, name, value: after[name] }));
}

function changesOfLayer(before: LayerSpecification, after: LayerSpecification): LayerChange[] {
  const { id } = after;
  const changes = [
    ...propertyChanges(id, 'paint', before.paint, after.paint),
    ...propertyChanges(id, 'layout', before.layout, after.layout),
  ];
  if (!isSame(filterOf(before), filterOf(after))) {
    changes.push({ kind: 'filter', id, filter: filterOf(after) });
  }
  if (before.minzoom !== after.minzoom || before.maxzoom !== after.maxzoom) {
    const { minzoom: least = ALL_ZOOMS.least, maxzoom: most = ALL_ZOOMS.most } = after;
    changes.push({ kind: 'zooms', id, least, most });
  }
  return changes;
}

/**
 * What turns the layers of one plan into those of another, both from the ground up. A layer whose
 * source is taken away and given back, `renewed`, is taken away and given back too.
 */
export function layerChanges(
  before: readonly LayerSpecification[],
  after: readonly LayerSpecification[],
  renewed: ReadonlySet<string> = new Set(),
): LayerChange[] {
  const wanted = new Map(after.map((layer) => [layer.id, layer]));
  const kept = before.filter((layer) => {
    const next = wanted.get(layer.id);
    const stays = layer.type === 'background' || !renewed.has(layer.source);
    return next !== undefined && stays && isSameLayer(layer, next);
  });
  const changes: LayerChange[] = before
    .filter((layer) => !kept.includes(layer))
    .map(({ id }) => ({ kind: 'remove', id }));
  const order = kept.map(({ id }) => id);
  let above: string | undefined;
  for (const layer of after.toReversed()) {
    const old = kept.find(({ id }) => id === layer.id);
    if (old === undefined) {
      changes.push({ kind: 'add', layer, before: above });
    } else {
      const last = order.at(-1);
      if (last !== layer.id) changes.push({ kind: 'move', id: layer.id, before: above });
      order.splice(order.indexOf(layer.id), 1);
      changes.push(...changesOfLayer(old, layer));
    }
    above = layer.id;
  }
  return changes;
}
