import type { Sequelize, Transaction } from 'sequelize';
import type { PartyValues } from '../../shared/schemas/parties.ts';
import { AppError } from '../errors.ts';
import { countInRegister } from '../models/measures.ts';
import { countRepresented, findPartiesById, type FoundParty } from '../models/parties.ts';
import { lockParties } from '../models/write-parties.ts';

/** What of a party its history keeps, buildings by reference. */
export function toldOfParty(party: FoundParty): Readonly<Record<string, unknown>> {
  const { kind, name, address, email, channel, representedBy, interests } = party;
  return {
    ...{ kind, name, address: address.replaceAll('\n', ', '), email, channel },
    representedBy: representedBy?.name ?? null,
    interests: interests.map((one) => {
      const days = [one.from ?? '', one.to ?? ''].join(' to ').trim();
      return `${one.kind} of ${one.building.reference}${days === 'to' ? '' : `, ${days}`}`;
    }),
  };
}

/**
 * Which values two states differ in. The trail says no more, for it is kept when personal data are erased.
 */
export function changedValues(
  before: Readonly<Record<string, unknown>>,
  after: Readonly<Record<string, unknown>>,
): string[] {
  return Object.keys(after).filter(
    (name) => JSON.stringify(before[name]) !== JSON.stringify(after[name]),
  );
}

/** A party of a scheme; of another scheme it is not there. */
export async function readParty(
  database: Sequelize,
  schemeId: string,
  id: string,
  transaction: Transaction | null = null,
): Promise<FoundParty> {
  const [found] = await findPartiesById(database, schemeId, [id], transaction);
  if (found === undefined) throw new AppError('not-found');
  return found;
}

/** A party that may be changed, as it was seen, kept from others until the transaction ends. */
export async function takeParty(
  database: Sequelize,
  schemeId: string,
  { id, version }: { readonly id: string; readonly version: number },
  transaction: Transaction,
): Promise<FoundParty> {
  await lockParties(database, schemeId, [id], transaction);
  const party = await readParty(database, schemeId, id, transaction);
  if (party.erasedAt !== null) throw new AppError('conflict', 'This party has been erased.');
  if (party.mergedInto !== null) {
    throw new AppError('conflict', 'This party has been merged into another. Open that one.');
  }
  if (party.version !== version) throw new AppError('conflict');
  return party;
}

function refuse(path: string, message: string): never {
  throw new AppError('invalid-input', undefined, [{ path, message }]);
}

/** Refuses buildings that are not in the register and were not held before, and who cannot represent. */
export async function requireSoundParty(
  database: Sequelize,
  schemeId: string,
  values: PartyValues,
  kept: FoundParty | null,
  transaction: Transaction,
): Promise<void> {
  const held = new Set(kept?.interests.map(({ building }) => building.id));
  const ids = new Set(values.interests.map(({ buildingId }) => buildingId));
  const wanted = [...ids].filter((id) => !held.has(id));
  const found = await countInRegister(database, schemeId, wanted, transaction);
  if (found !== wanted.length) {
    refuse('interests', 'One of these buildings is not in the register.');
  }
  const { representedBy } = values;
  if (representedBy === null || representedBy === kept?.representedBy?.id) return;
  const [who] = await findPartiesById(database, schemeId, [representedBy], transaction);
  if (who?.mergedInto !== null || who.erasedAt !== null) {
    refuse('representedBy', 'Whoever represents them has to be a party of this scheme.');
  }
  if (who.id === kept?.id) refuse('representedBy', 'Nobody represents themselves.');
  const represents = kept !== null && (await countRepresented(database, kept.id, transaction)) > 0;
  if (who.representedBy !== null || represents) {
    refuse('representedBy', 'Whoever represents others is not represented by another party.');
  }
}
