import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { LetterReason } from '../../shared/schemas/letters.ts';
import { INTEREST_TODAY } from './find-interested.ts';
import { standingParty } from './standing-party.ts';

/** Somebody who was left out of a batch or chosen by hand; no party where no letter can go to them now. */
export type KeptException = {
  readonly partyId: string | null;
  readonly name: string;
  readonly why: string;
};

/** Keeps who was left out of a batch although a rule names them. */
export async function insertExceptions(
  database: Sequelize,
  batchId: string,
  exceptions: readonly {
    readonly partyId: string;
    readonly reasons: readonly LetterReason[];
    readonly why: string;
  }[],
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into letter_exceptions (batch_id, party_id, reasons, why)
     select $2, "partyId", reasons, why
     from jsonb_to_recordset($1::jsonb) as left_out ("partyId" uuid, reasons jsonb, why text)`,
    { bind: [JSON.stringify(exceptions), batchId], transaction },
  );
}

/** Who was left out of a batch, and why; of erased parties the administrator alone reads why. */
export function findExceptions(
  database: Sequelize,
  batchId: string,
  isAdministrator: boolean,
): Promise<KeptException[]> {
  return database.query<KeptException>(
    `select * from (select distinct case when s.erased_at is null then s.id end as "partyId", s.name,
       case when s.erased_at is null or $2 then e.why else '' end as why
     from letter_exceptions e cross join lateral (${standingParty('e.party_id')}) s
     where e.batch_id = $1) kept order by name collate natural_order`,
    { type: QueryTypes.SELECT, bind: [batchId, isAdministrator] },
  );
}

/**
 * Who was chosen for a batch by hand, and why: their letters name no building as the reason. No party where
 * they have no interest in a building any more; of erased parties the administrator alone reads why.
 */
export function findChosen(
  database: Sequelize,
  batchId: string,
  isAdministrator: boolean,
): Promise<KeptException[]> {
  return database.query<KeptException>(
    `select * from (select distinct case when s.erased_at is null and exists (
         select from interests i join buildings b on b.id = i.building_id
         where i.party_id = s.id and b.removed_at is null and ${INTEREST_TODAY}
       ) then s.id end as "partyId", s.name,
       case when s.erased_at is null or $2 then l.reasons->0->>'why' else '' end as why
     from letters l cross join lateral (${standingParty('l.party_id')}) s
     where l.batch_id = $1 and jsonb_typeof(l.reasons->0->'building') = 'null'
     ) kept order by name collate natural_order`,
    { type: QueryTypes.SELECT, bind: [batchId, isAdministrator] },
  );
}
