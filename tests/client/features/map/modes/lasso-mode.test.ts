import type { Map as MapLibreMap } from 'maplibre-gl';
import { describe, expect, it } from 'vitest';
import { installLassoMode } from '../../../../../src/features/map/modes/lasso-mode.ts';
import type {
  GridPlace,
  GridProjection,
} from '../../../../../src/features/map/place/grid-projection.ts';

type Listener = (event: unknown) => void;

/** A grid of one metre a pixel. */
const PLAIN: GridProjection = { toGrid: (place) => place, toLonLat: (place) => place };

/** Of a map only what the mode needs; what the mode kept for itself is told by `kept`. */
function lasso() {
  const listeners = new Map<string, Set<Listener>>();
  const zoom = { isOn: true, disable: () => (zoom.isOn = false), enable: () => (zoom.isOn = true) };
  const map = {
    getCanvas: () => ({ style: { cursor: '' } }),
    project: ([x, y]: [number, number]) => ({ x, y }),
    unproject: ([x, y]: [number, number]) => ({ lng: x, lat: y }),
    doubleClickZoom: zoom,
    boxZoom: zoom,
    on: (name: string, listener: Listener) => {
      listeners.set(name, (listeners.get(name) ?? new Set()).add(listener));
      return { unsubscribe: () => listeners.get(name)?.delete(listener) };
    },
  };
  const places: GridPlace[] = [];
  const told = { closed: 0, under: null as GridPlace | null, kept: 0 };
  // the library's map has hundreds of methods that the mode never calls
  const remove = installLassoMode(map as unknown as MapLibreMap, PLAIN, {
    places: () => places,
    show: (place) => (told.under = place),
    add: (place) => places.push(place),
    close: () => (told.closed += 1),
  });
  function fire(name: string, x: number, y: number, fingers = 1): void {
    const originalEvent = new MouseEvent(name);
    const points = Array.from({ length: fingers }, () => ({ x, y }));
    const preventDefault = () => (told.kept += 1);
    const event = {
      ...{ point: { x, y }, originalEvent, preventDefault },
      ...(name.startsWith('touch') && { points }),
    };
    for (const listener of listeners.get(name) ?? []) listener(event);
  }
  /** As the map tells it: a press that stayed where it was is a click too. */
  function press(x: number, y: number): void {
    for (const name of ['mousedown', 'mouseup', 'click']) fire(name, x, y);
  }
  function drag(...along: readonly (readonly [number, number])[]): void {
    const [[x, y] = [0, 0]] = along;
    fire('mousedown', x, y);
    for (const [east, north] of along.slice(1)) fire('mousemove', east, north);
    const [endX, endY] = along.at(-1) ?? [0, 0];
    fire('mouseup', endX, endY);
    if (Math.hypot(endX - x, endY - y) < 3) fire('click', endX, endY);
  }
  function left(): number {
    return [...listeners.values()].reduce((sum, { size }) => sum + size, 0);
  }
  return { fire, press, drag, places, told, remove, left, zoom };
}

describe('the lasso', () => {
  it('sets a corner a press and closes where it began, once there is something inside', () => {
    const { fire, press, places, told } = lasso();
    press(50, 50);
    press(90, 50);
    press(54, 50);
    expect(told.closed).toBe(0);
    fire('mousemove', 70, 80);
    expect(told.under).toEqual([70, 80]);
    press(55, 52);
    expect(told.closed).toBe(1);
    expect(places).toEqual([[50, 50], [90, 50], [54, 50]]); // prettier-ignore
  });

  it('draws freehand along a drag, and closes where it is let go', () => {
    const { drag, places, told } = lasso();
    drag([0, 0], [1, 1], [20, 0], [20, 20], [21, 21], [0, 30]);
    expect(places).toEqual([[0, 0], [20, 0], [20, 20], [0, 30]]); // prettier-ignore
    expect([told.closed, told.kept]).toEqual([1, 1]);
  });

  it('closes once where a drag ends at its very beginning', () => {
    const { drag, told } = lasso();
    drag([0, 0], [20, 0], [20, 20], [0, 20], [1, 1]);
    expect(told.closed).toBe(1);
  });

  it('takes a drag that went nowhere for corners, and goes on', () => {
    const { drag, press, places, told } = lasso();
    drag([0, 0], [5, 0]);
    press(40, 40);
    expect([told.closed, places.length]).toEqual([0, 3]);
  });

  it('is drawn by a finger, and leaves two to the map', () => {
    const { fire, places, told } = lasso();
    fire('touchstart', 0, 0, 2);
    fire('touchmove', 50, 0, 2);
    fire('touchend', 50, 0);
    expect([places.length, told.kept]).toEqual([0, 0]);
    fire('touchstart', 0, 0);
    for (const [x, y] of [[30, 0], [30, 30], [0, 30]] as const) fire('touchmove', x, y); // prettier-ignore
    fire('touchend', 0, 30);
    expect([places.length, told.closed]).toEqual([4, 1]);
  });

  it('keeps what is drawn when the pointer leaves the map, and leaves the map as it was', () => {
    const { fire, places, told, remove, left, zoom } = lasso();
    fire('mousedown', 0, 0);
    for (const x of [10, 20, 30, 40]) fire('mousemove', x, x);
    fire('mouseout', 500, 0);
    fire('mouseup', 40, 40);
    expect([places.length, told.closed, told.under]).toEqual([5, 0, null]);
    expect(zoom.isOn).toBe(false);
    remove();
    expect([zoom.isOn, left()]).toEqual([true, 0]);
  });
});
