import type { Map as MapLibreMap } from 'maplibre-gl';
import { describe, expect, it } from 'vitest';
import type { Handle } from '../../../../../src/features/map/map-drawing.ts';
import { installLineMode } from '../../../../../src/features/map/modes/line-mode.ts';
import { installOutlineMode } from '../../../../../src/features/map/modes/outline-mode.ts';
import type { GridProjection } from '../../../../../src/features/map/place/grid-projection.ts';

type Listener = (event: unknown) => void;

/** A grid of one metre a pixel. */
const PLAIN: GridProjection = { toGrid: (place) => place, toLonLat: (place) => place };
const CORNER: Handle = { kind: 'corner', at: { part: 0, ring: 0, corner: 0 }, place: [50, 50] };

/** Of a map only what the modes need: building 5 stands everywhere. */
function smallMap() {
  const listeners = new Map<string, Set<Listener>>();
  const zoom = { isOn: true, disable: () => (zoom.isOn = false), enable: () => (zoom.isOn = true) };
  const map = {
    getCanvas: () => ({ style: { cursor: '' } }),
    getLayer: () => ({}),
    isMoving: () => false,
    project: ([x, y]: [number, number]) => ({ x, y }),
    unproject: ([x, y]: [number, number]) => ({ lng: x, lat: y }),
    queryRenderedFeatures: () => [{ id: 5 }, { id: 5 }],
    doubleClickZoom: zoom,
    boxZoom: zoom,
    on: (name: string, listener: Listener) => {
      listeners.set(name, (listeners.get(name) ?? new Set()).add(listener));
      return { unsubscribe: () => listeners.get(name)?.delete(listener) };
    },
    off: (name: string, listener: Listener) => listeners.get(name)?.delete(listener),
  };
  function fire(name: string, x: number, y = 50, shiftKey = false): void {
    const originalEvent = new MouseEvent(name, { shiftKey });
    const event = { point: { x, y }, originalEvent, preventDefault: () => undefined };
    for (const listener of listeners.get(name) ?? []) listener(event);
  }
  function left(): number {
    return [...listeners.values()].reduce((sum, { size }) => sum + size, 0);
  }
  // the library's map has hundreds of methods that the modes never call
  return { map: map as unknown as MapLibreMap, fire, left, zoom };
}

function installed(install: typeof installLineMode) {
  const small = smallMap();
  const told: unknown[] = [];
  const remove = install(small.map, PLAIN, {
    handles: () => [CORNER],
    show: (request) => told.push(['show', request?.place ?? null]),
    put: ({ place, near, isSquare, held }) =>
      told.push(['put', place, near, isSquare, held?.kind ?? null]),
    press: ({ kind }) => told.push(['press', kind]),
  });
  return { ...small, told, remove };
}

describe('the line mode', () => {
  it('sets a place where the ground is pressed, and presses what it is pressed on', () => {
    const { fire, told } = installed(installLineMode);
    fire('mousemove', 70);
    fire('click', 70);
    fire('click', 80, 50, true);
    fire('click', 55);
    expect(told).toEqual([
      ['show', [70, 50]],
      ['put', [70, 50], [5], false, null],
      ['put', [80, 50], [5], true, null],
      ['press', 'corner'],
    ]);
  });

  it('leaves the map as it was', () => {
    const { remove, left, zoom } = installed(installLineMode);
    expect(zoom.isOn).toBe(false);
    remove();
    expect([zoom.isOn, left()]).toEqual([true, 0]);
  });
});

describe('the outline mode', () => {
  it('drags what is taken hold of', () => {
    const { fire, told } = installed(installOutlineMode);
    fire('mousedown', 48);
    fire('mousemove', 60);
    fire('mouseup', 60);
    expect(told).toEqual([
      ['show', [60, 50]],
      ['put', [60, 50], [5], false, 'corner'],
    ]);
  });

  it('takes a drag of no length for a press, and one beside corners for the map’s', () => {
    const { fire, told } = installed(installOutlineMode);
    fire('mousedown', 50);
    fire('mousemove', 51);
    fire('mouseup', 51);
    fire('mousedown', 90);
    fire('mousemove', 99);
    fire('mouseup', 99);
    expect(told).toEqual([['press', 'corner']]);
  });

  it('gives up what leaves the map, and leaves the map as it was', () => {
    const { fire, told, remove, left } = installed(installOutlineMode);
    fire('mousedown', 50);
    fire('mousemove', 60);
    fire('mouseout', 200);
    fire('mouseup', 60);
    expect(told.at(-1)).toEqual(['show', null]);
    remove();
    expect(left()).toBe(0);
  });
});
