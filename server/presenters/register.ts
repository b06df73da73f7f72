import type { RegisterPage, RegisterRow } from '../../shared/schemas/register.ts';
import type { Scheme } from '../models/scheme.ts';
import { presentValues, type ListedBuilding } from './building-values.ts';

/** One row of the register. */
export function presentRegisterRow(building: ListedBuilding): RegisterRow {
  const { id, reference, west, south, east, north } = building;
  const centre: RegisterRow['centre'] = [(west + east) / 2, (south + north) / 2];
  return { id, reference, centre, ...presentValues(building) };
}

/** A page of the register as it is at the scheme's newest version. */
export function presentRegisterPage(
  { registerVersion }: Scheme,
  page: { readonly rows: readonly ListedBuilding[]; readonly found: number; readonly all: number },
): RegisterPage {
  const { rows, found, all } = page;
  return { rows: rows.map(presentRegisterRow), found, all, version: registerVersion };
}
