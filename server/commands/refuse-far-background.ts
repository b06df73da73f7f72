import { findCrs } from '../crs/find-crs.ts';
import { kilometresOutside } from '../crs/kilometres-outside.ts';
import { AppError } from '../errors.ts';
import type { BackgroundRow } from '../importers/read-background.ts';
import type { Scheme } from '../models/scheme.ts';

/** A river runs on beyond a border; what is drawn further off is somewhere else. */
const KILOMETRES_BESIDE = 100;

/** Refuses a layer that lies where the scheme's system is not used: the plan would show nothing but gaps. */
export async function refuseFarBackground(
  { crs }: Scheme,
  rows: readonly BackgroundRow[],
): Promise<void> {
  const system = await findCrs(crs);
  if (system === undefined || 'fault' in system) return;
  const beside = rows.map(({ bounds }) => kilometresOutside(bounds, system.crs.bounds));
  const far = beside.filter((kilometres) => kilometres > KILOMETRES_BESIDE);
  const furthest = Math.round(far.reduce((most, one) => Math.max(most, one), 0));
  if (far.length === 0) return;
  const which = far.length === rows.length ? 'These lie' : `${far.length} of ${rows.length} lie`;
  const upTo = far.length === 1 ? '' : 'up to ';
  throw new AppError(
    'invalid-input',
    `${which} ${upTo}${furthest} km outside of where EPSG:${crs} is used. Are the axes exchanged?`,
  );
}
