import type { CrsAnswer } from '../../shared/schemas/crs.ts';
import { AppError } from '../errors.ts';
import type { Scheme } from '../models/scheme.ts';
import { findCrs } from './find-crs.ts';

/** The system that a scheme is drawn on, which was looked at when the scheme was made. */
export async function crsOfScheme({ crs }: Pick<Scheme, 'crs'>): Promise<CrsAnswer> {
  const system = await findCrs(crs);
  if (system === undefined || 'fault' in system) throw new AppError('internal');
  return system.crs;
}
