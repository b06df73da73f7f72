import type { ExpressionSpecification } from 'maplibre-gl';

function whether(mark: 'selected' | 'hovered' | 'meant'): ExpressionSpecification {
  return ['boolean', ['feature-state', mark], false];
}

export const SELECTED = whether('selected');
export const HOVERED = whether('hovered');
export const MEANT = whether('meant');
const STANDS_OUT: ExpressionSpecification = ['any', SELECTED, HOVERED, MEANT];

/**
 * How solid buildings are that stand out, and the others. Even where both are the same this hangs
 * on a building's state: tiles on their way were read with one plan and are drawn with the next, and
 * the map cannot mark a building in them by what hung on no state when they were read.
 */
export function solidity(standingOut: number, others: number): ExpressionSpecification {
  return ['case', STANDS_OUT, standingOut, others];
}
