import { fromGeojsonVt } from '@maplibre/vt-pbf';
import { GeoJSONVT } from '@maplibre/geojson-vt';
import { describe, expect, it, vi } from 'vitest';
import type { MapPlan } from '../../../../../src/features/map/map-plan.ts';
import { drawPicture } from '../../../../../src/features/schemes/picture/draw-picture.ts';
import { loadPicture } from '../../../../../src/features/schemes/picture/load-picture.ts';

const SIZE = { width: 356, height: 150 };
const EXTENT = {
  bounds: [1.627, 54.744, 1.654, 54.757] as [number, number, number, number],
  home: [1.627, 54.744, 1.654, 54.757] as [number, number, number, number],
  crs: 32631,
  from: 'buildings' as const,
};
const PLAN: MapPlan = {
  latitude: 54.75,
  basemap: null,
  background: null,
  buildings: { url: '/tiles/{z}/{x}/{y}.pbf', bounds: null, minzoom: 13, maxzoom: 17 },
};

/** A tile with one building in the middle of the town. */
function aTile(): Uint8Array {
  const [w, s, e, n] = [1.64, 54.752, 1.6405, 54.7525];
  const coordinates = [[[w, s], [e, s], [e, n], [w, n], [w, s]]]; // prettier-ignore
  const geometry = { type: 'Polygon' as const, coordinates };
  const feature = { type: 'Feature' as const, properties: {}, geometry };
  const index = new GeoJSONVT({ type: 'FeatureCollection', features: [feature] }, { maxZoom: 13 });
  const tile = index.getTile(13, 4133, 2600);
  if (tile === null) throw new Error('The building stands in no tile.');
  return fromGeojsonVt({ buildings: tile });
}

function fakeTiles(): string[] {
  const asked: string[] = [];
  vi.stubGlobal('fetch', (address: string) => {
    asked.push(address);
    const isThere = address === '/tiles/13/4133/2600.pbf';
    return Promise.resolve(
      isThere ? new Response(new Uint8Array(aTile())) : new Response(null, { status: 404 }),
    );
  });
  return asked;
}

describe('a picture', () => {
  it('takes a tile that is not there for an empty one', async () => {
    const asked = fakeTiles();
    const { signal } = new AbortController();
    const { layers } = await loadPicture(PLAN, EXTENT, SIZE, signal);
    expect(asked).toEqual(['/tiles/13/4133/2600.pbf', '/tiles/13/4133/2601.pbf']);
    expect(layers.map(({ sheets }) => sheets.length)).toEqual([0, 0, 1]);
  });

  it('draws every building filled and outlined, inside its frame', async () => {
    fakeTiles();
    const points: number[] = [];
    vi.stubGlobal(
      'Path2D',
      class {
        moveTo(x: number, y: number): void {
          points.push(x, y);
        }
        lineTo(x: number, y: number): void {
          points.push(x, y);
        }
      },
    );
    const context = { scale: vi.fn(), fillRect: vi.fn(), fill: vi.fn(), stroke: vi.fn() };
    const canvas = document.createElement('canvas');
    Object.defineProperty(canvas, 'getContext', { value: () => context });
    const { signal } = new AbortController();
    drawPicture(canvas, await loadPicture(PLAN, EXTENT, SIZE, signal));
    expect(context.fill).toHaveBeenCalledOnce();
    expect(context.stroke).toHaveBeenCalledOnce();
    expect(points.length).toBeGreaterThanOrEqual(8);
    expect(Math.min(...points)).toBeGreaterThan(0);
    expect(Math.max(...points)).toBeLessThan(356);
    expect(canvas.width).toBe(356);
  });
});
