import type { ExpressionSpecification, LayerSpecification } from 'maplibre-gl';

const MARKS = ['selected', 'hovered', 'meant'].map((mark): ExpressionSpecification => [
  'boolean',
  ['feature-state', mark],
  false,
]);
const STANDS_OUT: ExpressionSpecification = ['any', ...MARKS];
const [SELECTED = false, , MEANT = false] = MARKS;

function unlessMeant(faint: number): ExpressionSpecification {
  return ['case', STANDS_OUT, 1, faint];
}

/** Layers of buildings of which only some are meant: the others are faint and have no name. */
export function meantLayers(layers: readonly LayerSpecification[]): LayerSpecification[] {
  return layers.map((layer) => {
    if (layer.type === 'fill') {
      return { ...layer, paint: { ...layer.paint, 'fill-opacity': unlessMeant(0.3) } };
    }
    if (layer.type === 'line') {
      return { ...layer, paint: { ...layer.paint, 'line-opacity': unlessMeant(0.35) } };
    }
    if (layer.type !== 'symbol') return layer;
    const opacity: ExpressionSpecification = ['case', SELECTED, 0, MEANT, 1, 0];
    return { ...layer, paint: { ...layer.paint, 'text-opacity': opacity } };
  });
}
