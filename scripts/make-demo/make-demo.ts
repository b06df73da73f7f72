import { writeTiles } from './tiles.ts';
import { makeTown } from './town.ts';
import { writeTown } from './write.ts';

/** The same town every time. */
const SEED = 7;

/** Makes Port Dogger for a number of buildings: its files, and the tiles of its basemap. */
export function makeDemo(buildings: number, folder: string, tilesFolder: string): string {
  const town = makeTown(buildings, SEED);
  writeTown(town, SEED, folder);
  const tiles = writeTiles(town, tilesFolder);
  return `${town.footprints.length} buildings, ${town.streets.length} streets, ${tiles} tiles`;
}
