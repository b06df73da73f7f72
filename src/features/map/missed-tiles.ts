import { z } from 'zod';

const tilePlace = z.object({ x: z.int(), y: z.int(), z: z.int() });

/** A tile by its column, row and zoom. */
export type TilePlace = z.infer<typeof tilePlace>;

/** What the map says of a tile that did not come; its types leave this out. */
const tileFault = z.object({
  sourceId: z.string(),
  tile: z.object({ tileID: z.object({ canonical: tilePlace }) }),
});

/** Tiles that did not come, and how to ask for them again. */
export type MissedTiles = {
  readonly note: (fault: object) => void;
  /** Asks again for what did not come, of one source or of all. */
  readonly fetchAgain: (source?: string) => void;
};

/**
 * Keeps which tiles did not come. They have to be asked for by name: a map that is told to fetch a whole
 * source again goes on waiting for an answer about each of these, and never comes to rest.
 */
export function createMissedTiles(
  refresh: (source: string, tiles: TilePlace[]) => void,
): MissedTiles {
  const missed = new Map<string, Map<string, TilePlace>>();
  return {
    note: (fault) => {
      const { data } = tileFault.safeParse(fault);
      if (data === undefined) return;
      const place = data.tile.tileID.canonical;
      const ofSource = missed.get(data.sourceId) ?? new Map<string, TilePlace>();
      missed.set(data.sourceId, ofSource.set(`${place.z}/${place.x}/${place.y}`, place));
    },
    fetchAgain: (source) => {
      for (const [name, tiles] of [...missed]) {
        if (source !== undefined && source !== name) continue;
        missed.delete(name);
        refresh(name, [...tiles.values()]);
      }
    },
  };
}
