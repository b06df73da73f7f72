import { QueryTypes, type Sequelize } from 'sequelize';
import type { LetterTextPart } from '../../shared/presentation/letter-text.ts';

/** A letter that was sent to a party, with those of some buildings that it names. */
export type FoundOwnLetter = {
  readonly id: string;
  readonly partyId: string;
  readonly subject: string;
  /** Whom it was written to. */
  readonly name: string;
  readonly parts: readonly LetterTextPart[];
  readonly sentAt: Date;
  readonly answerBy: string | null;
  readonly acknowledgedAt: Date | null;
  readonly buildings: readonly number[];
};

/** Whose letters are looked for; a letter is told of these buildings alone. */
export type WhoseLetters = {
  readonly parties: readonly string[];
  readonly buildings: readonly { readonly id: number }[];
};

const MOST = 500;

/** The letters that were sent to some parties of a scheme, the newest first, or one of them. */
export function findOwnLetters(
  database: Sequelize,
  schemeId: string,
  { parties, buildings }: WhoseLetters,
  letterId: string | null = null,
): Promise<FoundOwnLetter[]> {
  return database.query<FoundOwnLetter>(
    `select l.id, l.party_id as "partyId", l.subject, l.name, l.facts->'parts' as parts,
       b.sent_at as "sentAt", l.answer_by::text as "answerBy",
       a.acknowledged_at as "acknowledgedAt",
       array(
         select n.building_id from letter_buildings n
         where n.letter_id = l.id and n.building_id = any($3::integer[]) order by n.building_id
       ) as buildings
     from letters l
     join letter_batches b on b.id = l.batch_id
     left join letter_acknowledgements a on a.letter_id = l.id
     where l.scheme_id = $1 and l.party_id = any($2::uuid[]) and b.state = 'sent'
       and ($4::uuid is null or l.id = $4)
     order by b.sent_at desc, l.id limit ${MOST}`,
    {
      type: QueryTypes.SELECT,
      bind: [schemeId, parties, buildings.map(({ id }) => id), letterId],
    },
  );
}
