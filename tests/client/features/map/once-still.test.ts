import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { onceStill } from '../../../../src/features/map/once-still.ts';

/** A map that says that it is idle in the frame after it has all, if a frame is asked for. */
function aMap() {
  const listeners = new Set<() => void>();
  const map = {
    hasAll: false,
    frames: 0,
    loaded: () => map.hasAll,
    triggerRepaint: () => {
      map.frames += 1;
      for (const listener of [...listeners]) listener();
    },
    once: (_type: string, listener: () => void) => {
      listeners.add(listener);
      return map;
    },
    off: (_type: string, listener: () => void) => {
      listeners.delete(listener);
      return map;
    },
    listeners,
  };
  return map;
}

describe('onceStill', () => {
  beforeEach(() => {
    vi.useFakeTimers();
  });
  afterEach(() => {
    vi.useRealTimers();
  });

  it('asks for no frame while something is to come, and for one once all is there', () => {
    const map = aMap();
    const then = vi.fn();
    onceStill(map, then);
    vi.advanceTimersByTime(1000);
    expect(map.frames).toBe(0);
    // what came last was the same as before, and nobody drew it
    map.hasAll = true;
    vi.advanceTimersByTime(1000);
    expect(then).toHaveBeenCalledTimes(1);
    expect(map.frames).toBe(1);
    expect(map.listeners.size).toBe(0);
  });

  it('tells nothing after it was stopped', () => {
    const map = aMap();
    const then = vi.fn();
    const stop = onceStill(map, then);
    stop();
    map.hasAll = true;
    vi.advanceTimersByTime(1000);
    map.triggerRepaint();
    expect(then).not.toHaveBeenCalled();
    expect(vi.getTimerCount()).toBe(0);
  });
});
