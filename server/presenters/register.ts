import type { RegisterPage, RegisterRow } from '../../shared/schemas/register.ts';
import type { Register } from '../register/register-of.ts';
import {
  presentResults,
  presentStandings,
  presentValues,
  type ListedBuilding,
} from './building-values.ts';

/** One row of the register. */
export function presentRegisterRow(building: ListedBuilding): RegisterRow {
  const { id, reference, west, south, east, north } = building;
  const centre: RegisterRow['centre'] = [(west + east) / 2, (south + north) / 2];
  return {
    ...{ id, reference, centre, ...presentValues(building) },
    ...{ ...presentResults(building), ...presentStandings(building) },
  };
}

/** A page of a register, with its version and the run that its results are of. */
export function presentRegisterPage(
  { version, runId }: Register,
  page: { readonly rows: readonly ListedBuilding[]; readonly found: number; readonly all: number },
): RegisterPage {
  const { rows, found, all } = page;
  return { rows: rows.map(presentRegisterRow), found, all, version, run: runId };
}
