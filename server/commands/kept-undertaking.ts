import type { Sequelize, Transaction } from 'sequelize';
import type { UndertakingValues } from '../../shared/schemas/undertakings.ts';
import { AppError } from '../errors.ts';
import { countInRegister } from '../models/measures.ts';
import { findUndertakings, hasParty, type FoundUndertaking } from '../models/undertakings.ts';

/** What of an undertaking the trail keeps: of a party its number, not its name. */
export function toldOfUndertaking(values: UndertakingValues): object {
  const { promise, madeTo, partyId, source, buildingId, stretch } = values;
  const { due, responsible, doneOn, evidence } = values;
  const to = partyId === null ? { madeTo } : { party: partyId };
  return { promise, ...to, source, buildingId, stretch, due, responsible, doneOn, evidence };
}

function refused(path: string, message: string): AppError {
  return new AppError('invalid-input', undefined, [{ path, message }]);
}

/** Refuses a building or a party that is not of the scheme, unless it stood there before. */
export async function requireOfScheme(
  database: Sequelize,
  schemeId: string,
  values: UndertakingValues,
  before: FoundUndertaking | null,
  transaction: Transaction,
): Promise<void> {
  const { buildingId, partyId } = values;
  if (buildingId !== null && buildingId !== before?.building?.id) {
    const found = await countInRegister(database, schemeId, [buildingId], transaction);
    if (found === 0) throw refused('buildingId', 'This building is not in the register.');
  }
  if (partyId !== null && partyId !== before?.partyId) {
    const isThere = await hasParty(database, schemeId, partyId, transaction);
    if (!isThere) throw refused('partyId', 'This party is not in the list of parties.');
  }
}

/** An undertaking of a scheme; of another scheme it is not there. */
export async function readUndertaking(
  database: Sequelize,
  schemeId: string,
  id: string,
  transaction: Transaction,
): Promise<FoundUndertaking> {
  const [found] = await findUndertakings(database, schemeId, { id }, transaction);
  if (found === undefined) throw new AppError('not-found');
  return found;
}
