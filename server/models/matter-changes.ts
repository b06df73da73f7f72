import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { KeptSuggestion } from '../../shared/schemas/matter-answers.ts';
import type { MatterKind, MatterState, OwnMessage } from '../../shared/schemas/matters.ts';

/** A matter as it is brought up. */
export type OpenedMatter = {
  readonly id: string;
  readonly schemeId: string;
  readonly kind: MatterKind;
  readonly partyId: string;
  readonly buildingId: number;
  readonly title: string;
  readonly suggestion: KeptSuggestion | null;
  readonly due: string;
  readonly openedBy: string;
};

/** Keeps a new matter under the next number of its scheme, which is locked; gives the number. */
export async function insertMatter(
  database: Sequelize,
  matter: OpenedMatter,
  transaction: Transaction,
): Promise<number> {
  const { id, schemeId, kind, partyId, buildingId, title, suggestion, due, openedBy } = matter;
  const [row] = await database.query<{ number: number }>(
    `insert into matters (id, scheme_id, number, kind, party_id, building_id, title, suggestion, due,
       opened_by)
     select $1::uuid, $2::uuid, coalesce(max(number), 0) + 1, $3::text, $4::uuid, $5::integer, $6::text, $7::jsonb, $8::date,
       $9::uuid
     from matters where scheme_id = $2
     returning number`,
    {
      type: QueryTypes.SELECT,
      bind: [
        ...[id, schemeId, kind, partyId, buildingId, title],
        ...[suggestion && JSON.stringify(suggestion), due, openedBy],
      ],
      transaction,
    },
  );
  return row?.number ?? 0;
}

/** A message as it is written. */
export type WrittenMessage = Pick<OwnMessage, 'id' | 'text' | 'photographs'> & {
  readonly matterId: string;
  readonly by: string;
  readonly side: 'owner' | 'team' | 'note';
};

/** Keeps a message with the photographs that it announces. */
export async function insertMessage(
  database: Sequelize,
  { id, matterId, by, side, text, photographs }: WrittenMessage,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    'insert into matter_messages (id, matter_id, written_by, side, text) values ($1, $2, $3, $4, $5)',
    { bind: [id, matterId, by, side, text], transaction },
  );
  await database.query(
    `insert into matter_photographs (id, message_id, number, caption)
     select p.id, $1::uuid, p.number - 1, p.caption
     from unnest($2::uuid[], $3::text[]) with ordinality as p (id, caption, number)`,
    {
      bind: [id, photographs.map((one) => one.id), photographs.map(({ caption }) => caption)],
      transaction,
    },
  );
}

/** Where a matter stands from now on. */
export type MovedMatter = {
  readonly state: MatterState;
  readonly due: string;
  readonly assignedTo: string | null;
  readonly suggestion: KeptSuggestion | null;
};

/** Moves a matter on by one version. */
export async function updateMatter(
  database: Sequelize,
  id: string,
  { state, due, assignedTo, suggestion }: MovedMatter,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `update matters set state = $2, due = $3::date, assigned_to = $4::uuid, suggestion = $5::jsonb,
       version = version + 1, changed_at = now()
     where id = $1`,
    {
      bind: [id, state, due, assignedTo, suggestion && JSON.stringify(suggestion)],
      transaction,
    },
  );
}

/** How many matters of a person's wait for the team. */
export async function countOpenOf(
  database: Sequelize,
  personId: string,
  transaction: Transaction,
): Promise<number> {
  const [row] = await database.query<{ count: number }>(
    `select count(*)::integer as count from matters where opened_by = $1 and state = 'open'`,
    { type: QueryTypes.SELECT, bind: [personId], transaction },
  );
  return row?.count ?? 0;
}
