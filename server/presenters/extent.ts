import type { ExtentAnswer } from '../../shared/schemas/buildings.ts';
import type { UsableCrs } from '../crs/usable-crs.ts';
import type { Scheme } from '../models/scheme.ts';

const WORLD: ExtentAnswer['bounds'] = [-180, -85, 180, 85];

/** Where a scheme is; where nothing is drawn in it yet, where its system is used. */
export function presentExtent(
  { crs }: Scheme,
  drawn: Omit<ExtentAnswer, 'crs'> | undefined,
  system: UsableCrs | undefined,
): ExtentAnswer {
  if (drawn !== undefined) return { ...drawn, crs };
  const bounds = system !== undefined && 'crs' in system ? system.crs.bounds : WORLD;
  return { bounds, home: bounds, crs, from: 'crs' };
}
