import { isListed } from '../../shared/assessment/prepared-building.ts';
import type { LetterKind, LetterRule } from '../../shared/schemas/letter-settings.ts';
import { findTold, type Told } from '../models/find-told.ts';
import { findFootprints } from '../models/footprints.ts';
import { inBatches } from '../register/in-batches.ts';
import { meantIds } from '../register/meant-ids.ts';
import type { RegisterOf } from '../models/register-condition.ts';
import type { Reading } from '../register/values-beside.ts';
import { isNear } from './near-place.ts';

/** Buildings that rules name, each with what they say of it. */
export type Named = ReadonlyMap<number, readonly string[]>;

async function near(
  { database, transaction }: Reading,
  { near: place }: LetterRule,
  ids: readonly number[],
): Promise<readonly number[]> {
  if (place === null) return ids;
  const found: number[] = [];
  for await (const some of inBatches(ids)) {
    const footprints = await findFootprints(database, some, transaction ?? undefined);
    found.push(...some.filter((id) => isNear(footprints.get(id) ?? [], place)));
  }
  return found;
}

async function listed(
  { database, transaction }: Reading,
  rule: LetterRule,
  ids: readonly number[],
): Promise<readonly number[]> {
  if (!rule.listedOnly) return ids;
  const nothing = { runId: null, optionId: null };
  const told: Told[] = await findTold(database, nothing, ids, transaction);
  return told.filter((building) => isListed(building) === true).map(({ id }) => id);
}

/** The buildings that the rules of a kind of letter name, by the run that the register shows. */
export async function namedBuildings(
  reading: Reading,
  register: RegisterOf,
  rules: readonly LetterRule[],
  kind: LetterKind,
): Promise<Named> {
  const named = new Map<number, string[]>();
  for (const rule of rules.filter((one) => one.kind === kind && one.isOn)) {
    const meant = await meantIds(reading, register, rule.filter);
    for (const id of await listed(reading, rule, await near(reading, rule, meant))) {
      named.set(id, [...(named.get(id) ?? []), rule.why]);
    }
  }
  return named;
}
