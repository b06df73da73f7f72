import { useCallback, useSyncExternalStore } from 'react';

/** A phone held upright. */
export const NARROW = '(max-width: 639px)';

/** Whether the window is as a media query asks, now and as it changes. */
export function useMedia(query: string): boolean {
  const subscribe = useCallback(
    (changed: () => void) => {
      const list = window.matchMedia(query);
      list.addEventListener('change', changed);
      return () => {
        list.removeEventListener('change', changed);
      };
    },
    [query],
  );
  return useSyncExternalStore(subscribe, () => window.matchMedia(query).matches);
}
