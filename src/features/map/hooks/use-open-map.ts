import type { Map as MapLibreMap } from 'maplibre-gl';
import { useEffect, useState, type RefObject } from 'react';
import type { CameraBounds } from '../camera.ts';
import { openMap } from '../open-map.ts';

export type OpenedMap =
  | { readonly state: 'opening' }
  | { readonly state: 'open'; readonly map: MapLibreMap }
  | { readonly state: 'impossible' };

/** Opens a map in an element once and closes it when the element goes. */
export function useOpenMap(
  element: RefObject<HTMLElement | null>,
  label: string,
  home: CameraBounds,
): OpenedMap {
  const [opened, setOpened] = useState<OpenedMap>({ state: 'opening' });
  // where it starts; later it is moved by hand
  const [start] = useState(() => ({ label, home }));

  useEffect(() => {
    const container = element.current;
    if (container === null) return undefined;
    const gone = new AbortController();
    openMap({ container, ...start }, gone.signal).then(
      (map) => {
        setOpened({ state: 'open', map });
      },
      () => {
        if (!gone.signal.aborted) setOpened({ state: 'impossible' });
      },
    );
    return () => {
      gone.abort();
      setOpened({ state: 'opening' });
    };
  }, [element, start]);
  return opened;
}
