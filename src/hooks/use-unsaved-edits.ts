import { useEffect } from 'react';
import { useBlocker, type Blocker } from 'react-router-dom';

/** Stops whoever would leave the page with something written and not saved. */
export function useUnsavedEdits(hasEdits: boolean): Blocker {
  useEffect(() => {
    if (!hasEdits) return undefined;
    function ask(event: BeforeUnloadEvent) {
      event.preventDefault();
    }
    window.addEventListener('beforeunload', ask);
    return () => {
      window.removeEventListener('beforeunload', ask);
    };
  }, [hasEdits]);
  return useBlocker(
    ({ currentLocation, nextLocation }) =>
      hasEdits && currentLocation.pathname !== nextLocation.pathname,
  );
}
