import type { Sequelize, Transaction } from 'sequelize';
import type { NewBatch } from '../../shared/schemas/letter-batches.ts';
import type { LetterSettings } from '../../shared/schemas/letter-settings.ts';
import type { LetterReason } from '../../shared/schemas/letters.ts';
import { AppError } from '../errors.ts';
import { findInterested, findParties, type Interested } from '../models/find-interested.ts';
import { findShownRun } from '../models/find-shown-run.ts';
import { findTold, type Told } from '../models/find-told.ts';
import { namedBuildings } from './named-buildings.ts';

/** Somebody who gets a letter, or is left out. */
export type Recipient = {
  readonly party: Interested;
  readonly reasons: readonly LetterReason[];
  /** Why they get none although a rule names them. */
  readonly leftOut: string | null;
};

/** Who gets letters of a kind, by which run. */
export type FoundRecipients = {
  readonly runId: string | null;
  readonly recipients: readonly Recipient[];
  readonly told: ReadonlyMap<number, Told>;
  /** How many buildings are named in which nobody has an interest. */
  readonly without: number;
};

type Asked = Pick<NewBatch, 'kind' | 'leftOut' | 'chosen'>;

function addressOf({ address, name, reference }: Told): string {
  return address ?? name ?? reference;
}

function reasonsOf(
  { buildings }: Interested,
  named: ReadonlyMap<number, readonly string[]>,
  told: ReadonlyMap<number, Told>,
): LetterReason[] {
  return buildings.flatMap((id) => {
    const building = told.get(id);
    const where = building === undefined ? null : addressOf(building);
    return (named.get(id) ?? []).map((why) => ({ why, building: where }));
  });
}

/** Chosen by hand: with all their buildings, and never somebody whom a rule names already. */
async function chosenParties(
  database: Sequelize,
  schemeId: string,
  { chosen }: Asked,
  already: ReadonlySet<string>,
  transaction: Transaction | null,
): Promise<Recipient[]> {
  const wanted = new Map(chosen.map(({ partyId, why }) => [partyId, why]));
  const found = await findParties(database, schemeId, [...wanted.keys()], transaction);
  if (found.length < wanted.size) {
    throw new AppError(
      'invalid-input',
      'Somebody who was chosen is no party of the scheme by now.',
    );
  }
  const nowhere = found.find(({ buildings }) => buildings.length === 0);
  if (nowhere !== undefined) {
    throw new AppError('invalid-input', `${nowhere.name} has no interest in a building today.`);
  }
  return found
    .filter(({ partyId }) => !already.has(partyId))
    .map((party) => {
      const why = wanted.get(party.partyId) ?? '';
      return { party, reasons: [{ why, building: null }], leftOut: null };
    });
}

/** Who gets letters of a kind and why, as it stands now; by the run that the register shows. */
export async function findRecipients(
  database: Sequelize,
  schemeId: string,
  { rules }: LetterSettings,
  asked: Asked,
  transaction: Transaction | null,
): Promise<FoundRecipients> {
  const { runId, optionId } = await findShownRun(database, schemeId, transaction);
  const register = { schemeId, runId, optionId };
  const named = await namedBuildings({ database, transaction }, register, rules, asked.kind);
  const interested = await findInterested(database, schemeId, [...named.keys()], transaction);
  const already = new Set(interested.map(({ partyId }) => partyId));
  const chosen = await chosenParties(database, schemeId, asked, already, transaction);
  const ids = [...interested, ...chosen.map(({ party }) => party)].flatMap((one) => one.buildings);
  const rows = await findTold(database, register, [...new Set(ids)], transaction);
  const told = new Map(rows.map((row) => [row.id, row]));
  const leftOut = new Map(asked.leftOut.map(({ partyId, why }) => [partyId, why]));
  const held = new Set(interested.flatMap(({ buildings }) => buildings));
  return {
    runId,
    told,
    without: [...named.keys()].filter((id) => !held.has(id)).length,
    recipients: [
      ...interested.map((party) => ({
        party,
        reasons: reasonsOf(party, named, told),
        leftOut: leftOut.get(party.partyId) ?? null,
      })),
      ...chosen,
    ],
  };
}
