import type { Ground, Sampler } from './ground.ts';
import { betweenGrids } from './grid-place.ts';
import { gridSampler } from './sample-grid.ts';
import { spotSampler } from './sample-spots.ts';

/** Reads the levels of a ground at points of the scheme's grid. */
export async function samplerOf(ground: Ground, crs: number): Promise<Sampler> {
  if (ground.kind === 'level') return () => ({ level: ground.level, isNearest: false });
  if (ground.kind === 'spots') return spotSampler(ground);
  return gridSampler(ground, await betweenGrids(crs, ground.crs ?? crs));
}
