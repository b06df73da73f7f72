import type { Sequelize } from 'sequelize';
import { findShownRun } from '../models/find-shown-run.ts';
import type { RegisterOf } from '../models/register-condition.ts';
import type { Scheme } from '../models/scheme.ts';

/** A register at a version, with the results that it shows. */
export type Register = RegisterOf & { readonly version: number };

/** The register of a scheme as it is, with the results of its newest complete run. */
export async function registerOf(
  { database }: { readonly database: Sequelize },
  { id, registerVersion }: Pick<Scheme, 'id' | 'registerVersion'>,
): Promise<Register> {
  return { schemeId: id, version: registerVersion, runId: await findShownRun(database, id) };
}
