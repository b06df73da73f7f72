import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { LetterTextPart } from '../../shared/presentation/letter-text.ts';
import type { LetterKind } from '../../shared/schemas/letter-settings.ts';
import type { DELIVERY_STATES, LetterReason } from '../../shared/schemas/letters.ts';
import type { Composed } from '../letters/compose-letters.ts';

const AT_ONCE = 500;

/** Keeps the letters of a batch, numbered as they come. */
export async function insertLetters(
  database: Sequelize,
  batch: { readonly id: string; readonly schemeId: string },
  letters: readonly Composed[],
  transaction: Transaction,
): Promise<void> {
  const numbered = letters.map((letter, k) => ({ ...letter, number: k + 1 }));
  for (let from = 0; from < numbered.length; from += AT_ONCE) {
    const some = JSON.stringify(numbered.slice(from, from + AT_ONCE));
    await database.query(
      `insert into letters (id, scheme_id, batch_id, number, party_id, channel, name, address, email,
         subject, body, facts, reasons, answer_by)
       select id, $2, $3, number, "partyId", channel, name, address, email, subject, body, facts,
         reasons, "answerBy"
       from jsonb_to_recordset($1::jsonb) as letter (id uuid, number integer, "partyId" uuid,
         channel text, name text, address text, email text, subject text, body text, facts jsonb,
         reasons jsonb, "answerBy" date)`,
      { bind: [some, batch.schemeId, batch.id], transaction },
    );
    await database.query(
      `insert into letter_buildings (letter_id, building_id)
       select distinct letter.id, building.value::integer
       from jsonb_to_recordset($1::jsonb) as letter (id uuid, buildings jsonb),
         jsonb_array_elements_text(letter.buildings) as building`,
      { bind: [some], transaction },
    );
  }
}

/** A letter with where it stands on its way. */
export type FoundLetter = {
  readonly id: string;
  readonly batchId: string;
  readonly batchNumber: number;
  readonly kind: LetterKind;
  readonly number: number;
  readonly partyId: string;
  readonly channel: 'e-mail' | 'post';
  readonly name: string;
  readonly address: string;
  readonly email: string | null;
  readonly subject: string;
  readonly parts: readonly LetterTextPart[];
  readonly reasons: readonly LetterReason[];
  readonly answerBy: string | null;
  readonly sentAt: Date | null;
  readonly delivery: (typeof DELIVERY_STATES)[number];
  readonly serverWords: string | null;
  readonly acknowledgedAt: Date | null;
  readonly remindedAt: Date | null;
  /** Whether the party's personal data have been erased since. */
  readonly isErased: boolean;
};

/** Which letters are looked for. */
export type WhichLetters = {
  readonly batchId?: string;
  readonly letterId?: string;
  readonly buildingId?: number | undefined;
  readonly partyId?: string | undefined;
  /** By post only. */
  readonly byPost?: boolean;
  /** Sent so many days ago or more, with the day to answer by over, and not acknowledged. */
  readonly unansweredFor?: number | undefined;
};

const MOST = 20_000;

/** Letters of a scheme with where they stand, the newest batch first, by number. */
export function findLetters(
  database: Sequelize,
  schemeId: string,
  which: WhichLetters,
  transaction: Transaction | null = null,
): Promise<FoundLetter[]> {
  const { batchId, letterId, buildingId, partyId, byPost = false, unansweredFor } = which;
  return database.query<FoundLetter>(
    `select l.id, l.batch_id as "batchId", b.number as "batchNumber", b.kind, l.number,
       l.party_id as "partyId", l.channel, l.name, l.address, l.email, l.subject,
       l.facts->'parts' as parts, l.reasons, l.answer_by::text as "answerBy", b.sent_at as "sentAt",
       case when b.state <> 'sent' then 'not sent'
         when p.erased_at is not null and o.id is null and coalesce(x.printed_at > p.erased_at, true)
           then 'not sent'
         when l.channel = 'post' and x.batch_id is null then 'to be printed'
         when l.channel = 'post' then 'printed'
         when o.state = 'sent' and o.was_sent_again then 'sent again after a stop'
         else coalesce(o.state, 'waiting') end as delivery,
       o.server_words as "serverWords", a.acknowledged_at as "acknowledgedAt",
       m.put_in_at as "remindedAt", p.erased_at is not null as "isErased"
     from letters l
     join letter_batches b on b.id = l.batch_id
     join parties p on p.id = l.party_id
     left join outbox o on o.letter_id = l.id and not o.is_reminder
     left join outbox m on m.letter_id = l.id and m.is_reminder
     left join letter_acknowledgements a on a.letter_id = l.id
     left join letter_printings x on x.batch_id = b.id
     where l.scheme_id = $1
       and ($2::uuid is null or l.batch_id = $2)
       and ($3::uuid is null or l.id = $3)
       and ($4::integer is null or exists (
         select from letter_buildings n where n.letter_id = l.id and n.building_id = $4))
       and ($5::uuid is null or l.party_id = $5
         or p.merged_into = $5)
       and (not $6::boolean or l.channel = 'post')
       and ($7::integer is null or (b.state = 'sent' and a.letter_id is null
         and b.sent_at < now() - make_interval(days => $7)
         and coalesce(l.answer_by < current_date, true)))
     order by b.number desc, l.number limit ${MOST}`,
    {
      type: QueryTypes.SELECT,
      bind: [
        ...[schemeId, batchId ?? null, letterId ?? null, buildingId ?? null, partyId ?? null],
        ...[byPost, unansweredFor ?? null],
      ],
      transaction,
    },
  );
}
