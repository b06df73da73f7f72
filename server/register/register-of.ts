import type { Sequelize } from 'sequelize';
import { findShownRun } from '../models/find-shown-run.ts';
import type { RegisterOf } from '../models/register-condition.ts';
import type { Scheme } from '../models/scheme.ts';

/** A register at a version, with the results and the standings that it shows. */
export type Register = RegisterOf & {
  readonly version: number;
  readonly decisionsVersion: number;
};

/** The register of a scheme as it is, with the results of its newest complete run. */
export async function registerOf(
  { database }: { readonly database: Sequelize },
  {
    id,
    registerVersion,
    decisionsVersion,
  }: Pick<Scheme, 'id' | 'registerVersion' | 'decisionsVersion'>,
): Promise<Register> {
  const shown = await findShownRun(database, id);
  return { schemeId: id, version: registerVersion, decisionsVersion, ...shown };
}
