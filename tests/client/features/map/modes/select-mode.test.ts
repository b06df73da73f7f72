import type { Map as MapLibreMap } from 'maplibre-gl';
import { describe, expect, it } from 'vitest';
import { installSelectMode } from '../../../../../src/features/map/modes/select-mode.ts';

type Pixel = { readonly x: number; readonly y: number };
type Listener = (event: { readonly point: Pixel; readonly originalEvent: Event }) => void;

/** Of a map only what the mode needs: one building, 10 pixels wide, in its corner. */
function smallMap() {
  const listeners = new Map<string, Set<Listener>>();
  const canvas = { style: { cursor: '' } };
  const map = {
    getCanvas: () => canvas,
    getLayer: () => ({}),
    isMoving: () => false,
    on: (name: string, listener: Listener) => {
      listeners.set(name, (listeners.get(name) ?? new Set()).add(listener));
    },
    off: (name: string, listener: Listener) => {
      listeners.get(name)?.delete(listener);
    },
    queryRenderedFeatures: (place: unknown) => {
      const [x] = [place].flat(2);
      return typeof x === 'number' && x <= 10 ? [{ id: 5 }] : [];
    },
  };
  function fire(name: string, x: number, originalEvent = new Event('click')): void {
    for (const listener of listeners.get(name) ?? []) {
      listener({ point: { x, y: 0 }, originalEvent });
    }
  }
  // the library's map has hundreds of methods that the mode never calls
  return { map: map as unknown as MapLibreMap, canvas, fire };
}

function installed() {
  const { map, canvas, fire } = smallMap();
  const told: string[] = [];
  const remove = installSelectMode(map, {
    select: (id) => told.push(`select ${id ?? 'nothing'}`),
    hover: (id) => told.push(`hover ${id ?? 'nothing'}`),
  });
  return { canvas, fire, told, remove };
}

describe('the select mode', () => {
  it('selects the building that is pressed, and nothing beside buildings', () => {
    const { fire, told } = installed();
    fire('click', 5);
    fire('click', 15);
    expect(told).toEqual(['select 5', 'select nothing']);
  });

  it('gives a finger some room', () => {
    const { fire, told } = installed();
    fire('click', 17, new PointerEvent('click', { pointerType: 'touch' }));
    fire('click', 17, new PointerEvent('click', { pointerType: 'mouse' }));
    expect(told).toEqual(['select 5', 'select nothing']);
  });

  it('shows what can be pressed, until the map moves', () => {
    const { canvas, fire, told } = installed();
    fire('mousemove', 5);
    expect([canvas.style.cursor, told.at(-1)]).toEqual(['pointer', 'hover 5']);
    fire('movestart', 5);
    expect(told.at(-1)).toBe('hover nothing');
    fire('mousemove', 50);
    expect(canvas.style.cursor).toBe('');
  });

  it('leaves nothing behind', () => {
    const { canvas, fire, told, remove } = installed();
    fire('mousemove', 5);
    remove();
    const before = told.length;
    fire('click', 5);
    fire('mousemove', 5);
    expect(told).toHaveLength(before);
    expect([canvas.style.cursor, told.at(-1)]).toEqual(['', 'hover nothing']);
  });
});
