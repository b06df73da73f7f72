import type { Map as MapLibreMap } from 'maplibre-gl';
import { useEffect, useEffectEvent } from 'react';
import type { ModeHost } from '../modes/mode.ts';
import { MODES, type ModeName } from '../modes/modes.ts';

/** Keeps one mode installed, or none. */
export function useMode(map: MapLibreMap, name: ModeName | null, host: ModeHost): void {
  const select = useEffectEvent(host.select);
  const hover = useEffectEvent(host.hover);
  useEffect(() => {
    if (name === null) return undefined;
    return MODES[name](map, {
      select: (id) => {
        select(id);
      },
      hover: (id) => {
        hover(id);
      },
    });
  }, [map, name]);
}
