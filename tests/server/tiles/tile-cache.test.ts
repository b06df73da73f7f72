import { expect, test } from 'vitest';
import { createTileCache } from '../../../server/tiles/tile-cache.ts';

/** Makes tiles of so many bytes, and counts how many it made. */
function maker(bytes: number) {
  const made: string[] = [];
  function of(key: string): () => Promise<Buffer> {
    return () => {
      made.push(key);
      return Promise.resolve(Buffer.alloc(bytes));
    };
  }
  return { made, of };
}

test('a tile is made once', async () => {
  const cache = createTileCache();
  const { made, of } = maker(10);
  const first = await cache.get('a', of('a'));
  expect(await cache.get('a', of('a'))).toBe(first);
  expect(made).toEqual(['a']);
});

test('two who ask at once share one making', async () => {
  const cache = createTileCache();
  const { made, of } = maker(10);
  const [one, other] = await Promise.all([cache.get('a', of('a')), cache.get('a', of('a'))]);
  expect(one).toBe(other);
  expect(made).toEqual(['a']);
});

test('the longest unused are forgotten beyond the bound', async () => {
  const cache = createTileCache(35);
  const { made, of } = maker(10);
  for (const key of ['a', 'b', 'c', 'a', 'd']) await cache.get(key, of(key));
  expect(made).toEqual(['a', 'b', 'c', 'd']);
  for (const key of ['a', 'c', 'd', 'b']) await cache.get(key, of(key));
  expect(made).toEqual(['a', 'b', 'c', 'd', 'b']);
});

test('empty tiles are not kept without end', async () => {
  const cache = createTileCache(100);
  const { made, of } = maker(0);
  for (let k = 0; k < 1000; k += 1) await cache.get(`key ${k}`, of('x'));
  await cache.get('key 0', of('key 0'));
  expect(made.at(-1)).toBe('key 0');
});

test('a tile larger than the bound is answered and not kept', async () => {
  const cache = createTileCache(35);
  const { made, of } = maker(100);
  expect(await cache.get('a', of('a'))).toHaveLength(100);
  await cache.get('a', of('a'));
  expect(made).toEqual(['a', 'a']);
});

test('what failed is tried again', async () => {
  const cache = createTileCache();
  const { of } = maker(10);
  const broken = new Error('The database is gone.');
  await expect(cache.get('a', () => Promise.reject(broken))).rejects.toBe(broken);
  expect(await cache.get('a', of('a'))).toHaveLength(10);
});
