import { useState } from 'react';
import { useKeyHelp } from '../../../hooks/use-key-help.ts';
import type { MapLasso } from '../../map/map-lasso.ts';
import { withBeside } from '../filter-parts.ts';
import { LASSO_KEYS } from '../register-keys.ts';
import type { RegisterAddress } from './use-register-address.ts';

/** The outline on the map by which the register is filtered, and the drawing of another. */
export function useLassoFilter({ which, setFilter }: RegisterAddress): MapLasso {
  const [isDrawing, setDrawing] = useState(false);
  const { filter } = which;
  useKeyHelp(LASSO_KEYS, isDrawing);
  return {
    isDrawing,
    outline: filter.inside ?? null,
    onPress: () => {
      setDrawing(!isDrawing);
    },
    onLeave: () => {
      setDrawing(false);
    },
    onClose: (outline) => {
      setDrawing(false);
      setFilter(withBeside(filter, { inside: outline.map(([east, north]) => [east, north]) }));
    },
  };
}
