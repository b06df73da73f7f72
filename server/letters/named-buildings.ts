import { isListed } from '../../shared/assessment/prepared-building.ts';
import type { LetterKind, LetterRule } from '../../shared/schemas/letter-settings.ts';
import { findShafts } from '../models/find-alignments.ts';
import { findTold, type Told } from '../models/find-told.ts';
import { findFootprints } from '../models/footprints.ts';
import { inBatches } from '../register/in-batches.ts';
import { meantIds } from '../register/meant-ids.ts';
import type { RegisterOf } from '../models/register-condition.ts';
import type { Reading } from '../register/values-beside.ts';
import { isNear } from './near-place.ts';

/** Buildings that rules name, each with what they say of it. */
export type Named = ReadonlyMap<number, readonly string[]>;

type Place = Parameters<typeof isNear>[1];

/** Those of some buildings that are near to one of some places. */
async function near(
  { database, transaction }: Reading,
  places: readonly Place[] | null,
  ids: readonly number[],
): Promise<readonly number[]> {
  if (places === null) return ids;
  const found: number[] = [];
  for await (const some of inBatches(ids)) {
    const footprints = await findFootprints(database, some, transaction ?? undefined);
    const isThere = (id: number) => places.some((place) => isNear(footprints.get(id) ?? [], place));
    found.push(...some.filter(isThere));
  }
  return found;
}

/** The buildings that a rule means by their values and by where they stand. */
async function meant(
  reading: Reading,
  register: RegisterOf,
  { filter, near: place, shaftWithin }: LetterRule,
): Promise<readonly number[]> {
  const { database, transaction } = reading;
  const shafts =
    shaftWithin === null ? null : await findShafts(database, register, transaction ?? null);
  // no shaft, nobody near one: the register need not be asked
  if (shafts?.length === 0) return [];
  const besideShafts = shafts?.map((shaft) => ({ ...shaft, metres: shaftWithin ?? 0 })) ?? null;
  const ids = await near(reading, besideShafts, await meantIds(reading, register, filter));
  return near(reading, place === null ? null : [place], ids);
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
    for (const id of await listed(reading, rule, await meant(reading, register, rule))) {
      named.set(id, [...(named.get(id) ?? []), rule.why]);
    }
  }
  return named;
}
