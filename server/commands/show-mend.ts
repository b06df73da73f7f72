import type { z } from 'zod';
import type { mendSchema } from '../../shared/schemas/imports.ts';
import { AppError } from '../errors.ts';
import { cleanRings } from '../imports/clean-rings.ts';
import { crossingOfFootprint } from '../imports/crossing-of-footprint.ts';
import { mendFootprint } from '../imports/mend-footprint.ts';
import { eachCorner, placementOf, type Placement } from '../imports/placement.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import type { RegisterImport } from '../models/register-import.ts';
import type { Scheme } from '../models/scheme.ts';
import { findStagedRow } from '../models/staged-rows.ts';
import type { Services } from '../services.ts';

/** With corners of its own, as the answer's shape wants them. */
function onMap(footprint: FootprintRings, { toLonLat }: Placement): [number, number][][][] {
  return footprint.map((part) => part.map((ring) => ring.map(toLonLat)));
}

/** The footprint of a row whose ring crosses itself, as it was read and as it would be mended. */
export async function showMend(
  { database }: Services,
  scheme: Scheme,
  { id, options }: RegisterImport,
  row: number,
): Promise<z.infer<typeof mendSchema>> {
  const { crs } = options.place;
  const staged = await findStagedRow(database, id, row);
  if (crs === null || !staged?.geometry) throw new AppError('not-found');
  const placement = await placementOf({ ...options.place, crs }, scheme.crs);
  const before = cleanRings(eachCorner(staged.geometry, placement.toGrid));
  if (before === undefined || crossingOfFootprint(before) === undefined) {
    throw new AppError('not-found');
  }
  const after = mendFootprint(before);
  return {
    before: onMap(before, placement),
    after: after === undefined ? null : onMap(after, placement),
  };
}
