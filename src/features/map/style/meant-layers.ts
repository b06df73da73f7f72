import type { ExpressionSpecification, LayerSpecification } from 'maplibre-gl';
import { MEANT, SELECTED, solidity } from './building-states.ts';

const NAMED: ExpressionSpecification = ['case', SELECTED, 0, MEANT, 1, 0];

/** Layers of buildings of which only some are meant: the others are faint and have no name. */
export function meantLayers(layers: readonly LayerSpecification[]): LayerSpecification[] {
  return layers.map((layer) => {
    if (layer.type === 'fill') {
      return { ...layer, paint: { ...layer.paint, 'fill-opacity': solidity(1, 0.3) } };
    }
    if (layer.type === 'line') {
      // by a name of its own: elsewhere no line's opacity hangs on the state of its building
      const paint = { ...layer.paint, 'line-opacity': solidity(1, 0.35) };
      return { ...layer, id: `meant-${layer.id}`, paint };
    }
    if (layer.type !== 'symbol') return layer;
    return { ...layer, paint: { ...layer.paint, 'text-opacity': NAMED } };
  });
}
