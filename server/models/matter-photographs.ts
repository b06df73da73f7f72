import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { PhotographType } from '../../shared/schemas/visits.ts';
import { standingParty } from './standing-party.ts';

/** The file of a photograph that has arrived: its hash, type and length. */
export type PhotographFile = {
  readonly sha256: string;
  readonly type: PhotographType;
  readonly bytes: number;
};

/** A photograph that a message of a matter announced. */
export type MatterPhotograph = {
  readonly id: string;
  /** Its place among those of its message, from 0. */
  readonly number: number;
  readonly file: PhotographFile | null;
  /** Whether the personal data of whoever sent it have been erased. */
  readonly isErased: boolean;
};

type Place = { readonly matterId: string; readonly matterPhotographId: string };

/** A photograph of a matter of a scheme, of these parties' where some are named; undefined if there is none. */
export async function findMatterPhotograph(
  database: Sequelize,
  schemeId: string,
  { matterId, matterPhotographId }: Place,
  parties: readonly string[] | null = null,
): Promise<MatterPhotograph | undefined> {
  const [found] = await database.query<MatterPhotograph>(
    `select p.id, p.number,
       case when f.photograph_id is null then null
         else json_build_object('sha256', f.sha256, 'type', f.type, 'bytes', f.bytes) end as file,
       party.erased_at is not null as "isErased"
     from matter_photographs p
     join matter_messages g on g.id = p.message_id
     join matters m on m.id = g.matter_id
     cross join lateral (${standingParty('m.party_id')}) party
     left join matter_photograph_files f on f.photograph_id = p.id
     where m.scheme_id = $1 and m.id = $2 and p.id = $3
       and ($4::uuid[] is null or (m.party_id = any($4) and g.side <> 'note'))`,
    { type: QueryTypes.SELECT, bind: [schemeId, matterId, matterPhotographId, parties] },
  );
  return found;
}

/** Keeps the file of a photograph unless one is there; gives the one that is there then. */
export async function keepPhotographFile(
  database: Sequelize,
  photographId: string,
  { sha256, type, bytes }: PhotographFile,
  transaction: Transaction,
): Promise<PhotographFile> {
  await database.query(
    `insert into matter_photograph_files (photograph_id, sha256, type, bytes)
     values ($1, $2, $3, $4) on conflict do nothing`,
    { bind: [photographId, sha256, type, bytes], transaction },
  );
  const [kept] = await database.query<PhotographFile>(
    'select sha256, type, bytes from matter_photograph_files where photograph_id = $1',
    { type: QueryTypes.SELECT, bind: [photographId], transaction },
  );
  return kept ?? { sha256, type, bytes };
}
