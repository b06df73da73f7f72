import { AppError } from '../errors.ts';
import { betweenGrids } from './grid-place.ts';
import { groundFacts, type Ground } from './ground.ts';
import { isLevel } from './level-range.ts';
import { isGrid, readGrid } from './read-grid.ts';
import { readSpots } from './read-spots.ts';

/** Reads an uploaded file of levels, a grid or spot heights, or a refusal that says what is wrong. */
export async function readGround(
  bytes: Buffer,
  { crs, schemeCrs }: { readonly crs: number | undefined; readonly schemeCrs: number },
): Promise<Ground> {
  if (crs !== undefined) await betweenGrids(crs, schemeCrs);
  if (bytes.includes(0)) {
    throw new AppError('unreadable', 'Send text: CSV with spot heights, or an ASCII grid.');
  }
  const ground = isGrid(bytes)
    ? await readGrid(bytes, crs)
    : await readSpots(bytes, { crs, schemeCrs });
  const { points, lowest, highest } = groundFacts(ground);
  if (points === 0) throw new AppError('unreadable', 'The grid holds no level.');
  if (!isLevel(lowest) || !isLevel(highest)) {
    const message = `Levels run from ${lowest} to ${highest} m. Check units, and which value stands for none.`;
    throw new AppError('unreadable', message);
  }
  return ground;
}
