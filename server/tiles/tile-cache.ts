/** How much the cache keeps: some thousand tiles of a town. */
const MOST_BYTES = 64 * 1024 * 1024;

/** Keeps what was made last; of two who ask at once, the second waits for the first. */
export type TileCache = {
  readonly get: (key: string, make: () => Promise<Buffer>) => Promise<Buffer>;
  /** Whether it is kept, so that nothing has to be made. */
  readonly has: (key: string) => boolean;
};

/** A cache of tiles that forgets the longest unused ones beyond so many bytes. */
export function createTileCache(mostBytes = MOST_BYTES): TileCache {
  const kept = new Map<string, Buffer>();
  const making = new Map<string, Promise<Buffer>>();
  let bytes = 0;

  function keep(key: string, tile: Buffer): void {
    kept.set(key, tile);
    // an empty tile costs its key
    bytes += tile.byteLength + key.length;
    for (const [oldest, { byteLength }] of kept) {
      if (bytes <= mostBytes) return;
      kept.delete(oldest);
      bytes -= byteLength + oldest.length;
    }
  }

  async function made(key: string, make: () => Promise<Buffer>): Promise<Buffer> {
    try {
      const tile = await make();
      keep(key, tile);
      return tile;
    } finally {
      making.delete(key);
    }
  }

  return {
    has: (key) => kept.has(key),
    get: (key, make) => {
      const known = kept.get(key);
      if (known === undefined) {
        const promise = making.get(key) ?? made(key, make);
        making.set(key, promise);
        return promise;
      }
      kept.delete(key);
      kept.set(key, known);
      return Promise.resolve(known);
    },
  };
}
