/** How often a map that is drawing is asked whether it has all. */
const LOOK_EVERY_MS = 100;

/** What is asked of a map here. */
type DrawnMap = {
  readonly loaded: () => boolean;
  readonly triggerRepaint: () => void;
  readonly once: (type: 'idle', listener: () => void) => unknown;
  readonly off: (type: 'idle', listener: () => void) => unknown;
};

/**
 * Tells once the map has drawn all; what it returns stops waiting. The map says so itself, but only after
 * a frame: where the last thing to come changes nothing, like a tile that is the same as before, none is
 * drawn unless it is asked for.
 */
export function onceStill(map: DrawnMap, then: () => void): () => void {
  function stop(): void {
    clearInterval(looking);
    map.off('idle', finish);
  }
  function finish(): void {
    stop();
    then();
  }
  const looking = setInterval(() => {
    if (map.loaded()) map.triggerRepaint();
  }, LOOK_EVERY_MS);
  map.once('idle', finish);
  return stop;
}
