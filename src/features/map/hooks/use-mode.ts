import type { Map as MapLibreMap } from 'maplibre-gl';
import { useEffect, useEffectEvent } from 'react';
import type { ModeHost } from '../modes/mode.ts';
import { MODES, type ModeName } from '../modes/modes.ts';

/** Keeps one mode installed. */
export function useMode(map: MapLibreMap, name: ModeName, host: ModeHost): void {
  const select = useEffectEvent(host.select);
  const hover = useEffectEvent(host.hover);
  useEffect(
    () =>
      MODES[name](map, {
        select: (id) => {
          select(id);
        },
        hover: (id) => {
          hover(id);
        },
      }),
    [map, name],
  );
}
