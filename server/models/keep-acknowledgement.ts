import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';

type Acknowledgement = { readonly letterId: string; readonly by: string; readonly how: string };

/** Keeps that a letter was acknowledged; whether that is new. */
export async function keepAcknowledgement(
  database: Sequelize,
  { letterId, by, how }: Acknowledgement,
  transaction: Transaction,
): Promise<boolean> {
  const kept = await database.query(
    `insert into letter_acknowledgements (letter_id, by_person, how) values ($1, $2, $3)
     on conflict do nothing returning letter_id`,
    { type: QueryTypes.SELECT, bind: [letterId, by, how], transaction },
  );
  return kept.length > 0;
}
