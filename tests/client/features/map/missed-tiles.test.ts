import { expect, it, vi } from 'vitest';
import { createMissedTiles } from '../../../../src/features/map/missed-tiles.ts';

function missing(sourceId: string, x: number): object {
  return { sourceId, tile: { tileID: { canonical: { x, y: 2, z: 3 } } } };
}

it('asks for each tile that did not come once, by its name', () => {
  const refresh = vi.fn();
  const missed = createMissedTiles(refresh);
  missed.note(missing('buildings', 1));
  missed.note(missing('buildings', 1));
  missed.note(missing('buildings', 4));
  missed.note(missing('basemap', 1));
  missed.note({});
  missed.fetchAgain('basemap');
  expect(refresh.mock.calls).toEqual([['basemap', [{ x: 1, y: 2, z: 3 }]]]);
  refresh.mockClear();
  missed.fetchAgain();
  missed.fetchAgain();
  const two = [1, 4].map((x) => ({ x, y: 2, z: 3 }));
  expect(refresh.mock.calls).toEqual([['buildings', two]]);
});
