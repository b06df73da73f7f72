import { AppError } from '../errors.ts';

const TAKEN =
  'Taken are GeoJSON, a zipped Shapefile, GeoPackage, CityJSON, CSV with well-known text, and XLSX.';

/** A refusal of a file of another kind: what it seems to be, what to do and what is taken. */
export function notTaken(what: string, cure?: string): AppError {
  const advice = cure === undefined ? '' : ` ${cure}`;
  return new AppError('unreadable', `The file seems to be ${what}.${advice} ${TAKEN}`);
}
