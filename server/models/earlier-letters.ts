import { QueryTypes, type Sequelize } from 'sequelize';
import type { LetterKind } from '../../shared/schemas/letter-settings.ts';
import { standingParty } from './standing-party.ts';

/** A letter of a kind that somebody had for a building of theirs, or that waits for them in a batch. */
export type FoundEarlier = {
  readonly partyId: string;
  readonly batchNumber: number;
  readonly sentAt: Date | null;
  readonly buildings: readonly string[];
};

/** A mail that failed was had by nobody; a merged party had what both had. */
function earlierOf(asked: string, which: string): string {
  return `
    with asked as (${asked})
    select asked.party_id as "partyId", b.number as "batchNumber", b.sent_at as "sentAt",
      array_agg(distinct coalesce(h.address, h.name, h.reference)) as buildings
    from asked
    join buildings h on h.id = asked.building_id
    join letter_buildings n on n.building_id = asked.building_id
    join letters l on l.id = n.letter_id
    join letter_batches b on b.id = l.batch_id and b.scheme_id = $1 and b.kind = $2
    left join outbox o on o.letter_id = l.id and not o.is_reminder
    cross join lateral (${standingParty('l.party_id')}) s
    where s.id = asked.standing_id and o.state is distinct from 'failed' and ${which}
    group by asked.party_id, b.number, b.sent_at
    order by b.number desc`;
}

const SENT_OR_TO_BE = `b.state in ('sent', 'checked', 'waiting for check')`;

/** Which of some parties had a letter of a kind for one of their buildings, or have it waiting. */
export function findEarlierOf(
  database: Sequelize,
  { schemeId, kind }: { readonly schemeId: string; readonly kind: LetterKind },
  parties: readonly { readonly partyId: string; readonly buildings: readonly number[] }[],
): Promise<FoundEarlier[]> {
  const asked = `
    select a.party_id, a.party_id as standing_id, o.value::integer as building_id
    from jsonb_to_recordset($3::jsonb) as a (party_id uuid, buildings jsonb),
      jsonb_array_elements_text(a.buildings) as o`;
  const given = parties.map(({ partyId, buildings }) => ({ party_id: partyId, buildings }));
  return database.query<FoundEarlier>(earlierOf(asked, SENT_OR_TO_BE), {
    type: QueryTypes.SELECT,
    bind: [schemeId, kind, JSON.stringify(given)],
  });
}

/** The same of those whom a batch writes to, beside it; once it is sent, what was sent before it. */
export function findEarlierOfBatch(
  database: Sequelize,
  schemeId: string,
  batch: { readonly id: string; readonly kind: LetterKind; readonly sentAt: Date | null },
): Promise<FoundEarlier[]> {
  const asked = `
    select l.party_id, s.id as standing_id, n.building_id
    from letters l join letter_buildings n on n.letter_id = l.id
    cross join lateral (${standingParty('l.party_id')}) s where l.batch_id = $3`;
  const which = `b.id <> $3 and case when $4::timestamptz is null then ${SENT_OR_TO_BE}
    else b.sent_at < $4 end`;
  return database.query<FoundEarlier>(earlierOf(asked, which), {
    type: QueryTypes.SELECT,
    bind: [schemeId, batch.kind, batch.id, batch.sentAt],
  });
}
