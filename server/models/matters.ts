import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { Matter, MatterLine } from '../../shared/schemas/matter-answers.ts';
import type { MattersQuery } from '../../shared/schemas/matters.ts';
import type { Actor } from '../policies/actor.ts';
import { standingParty } from './standing-party.ts';

type Dated = { readonly openedAt: Date; readonly changedAt: Date };

/** A line of the inbox as its presenter wants it. */
export type FoundMatterLine = Omit<MatterLine, keyof Dated> & Dated & { readonly total: number };

/** A matter with what was written, as its presenters want it. */
export type FoundMatter = Omit<Matter, keyof Dated | 'assessors'> &
  Dated & { readonly openedBy: string };

const MOST = 500;

const LINE = `m.id, m.number, m.kind, m.title, m.suggestion, m.state, m.due::text as due, m.version,
  m.opened_at as "openedAt", m.changed_at as "changedAt",
  json_build_object('id', party.id, 'name', party.name) as party,
  case when a.id is null then null else json_build_object('id', a.id, 'name', a.name) end
    as "assignedTo",
  (m.state = 'open' and m.due < current_date) as "isOverdue",
  party.erased_at is not null as "isErased"`;

const FROM = `from matters m
  join buildings b on b.id = m.building_id
  cross join lateral (${standingParty('m.party_id')}) party
  left join people a on a.id = m.assigned_to`;

const SEARCHED = `
  $7::text is null
  or position(lower($7) in lower(concat_ws(' ', '#' || m.number, b.reference, b.name, b.address))) > 0
  or ($8 or party.erased_at is null) and (position(lower($7) in lower(m.title || ' ' || party.name)) > 0 or exists (
    select from matter_messages s where s.matter_id = m.id and position(lower($7) in lower(s.text)) > 0))`;

/**
 * The matters of a scheme that a filter means: what is due first, then the others, the newest first. What
 * erased parties wrote is found by the administrator alone.
 */
export function findMatters(
  database: Sequelize,
  schemeId: string,
  query: MattersQuery,
  reader: Actor,
): Promise<FoundMatterLine[]> {
  const { state, kind, mine, overdue, building, text } = query;
  return database.query<FoundMatterLine>(
    `select ${LINE},
       json_build_object('id', b.id, 'reference', b.reference, 'name', b.name, 'address', b.address)
         as building,
       (select count(*)::integer from matter_messages g where g.matter_id = m.id) as messages,
       (count(*) over ())::integer as total
     ${FROM}
     where m.scheme_id = $1
       and ($2::text is null or m.state = $2)
       and ($3::text is null or m.kind = $3)
       and ($4::uuid is null or m.assigned_to = $4)
       and (not $5 or (m.state = 'open' and m.due < current_date))
       and ($6::integer is null or m.building_id = $6)
       and (${SEARCHED})
     order by m.state <> 'open', case when m.state = 'open' then m.due end, m.changed_at desc, m.id
     limit ${MOST}`,
    {
      type: QueryTypes.SELECT,
      bind: [
        schemeId,
        state ?? null,
        kind ?? null,
        mine === true ? reader.id : null,
        overdue === true,
        building ?? null,
        text === undefined || text === '' ? null : text,
        reader.isAdministrator,
      ],
    },
  );
}

const PHOTOGRAPHS = `
  select coalesce(json_agg(json_build_object(
      'id', p.id, 'caption', p.caption, 'hasArrived', f.photograph_id is not null
    ) order by p.number), '[]')
  from matter_photographs p left join matter_photograph_files f on f.photograph_id = p.id
  where p.message_id = g.id`;

const MESSAGES = `
  select coalesce(json_agg(json_build_object(
      'id', g.id, 'side', g.side, 'by', w.name, 'text', g.text, 'writtenAt', g.written_at,
      'photographs', (${PHOTOGRAPHS})
    ) order by g.written_at, g.id), '[]')
  from matter_messages g join people w on w.id = g.written_by
  where g.matter_id = m.id`;

type Which = {
  readonly id?: string;
  /** Only those of these parties. */
  readonly parties?: readonly string[];
};

/** Matters of a scheme with everything that was written, the newest first. */
export function findMatterThreads(
  database: Sequelize,
  schemeId: string,
  { id, parties }: Which,
  transaction: Transaction | null = null,
): Promise<FoundMatter[]> {
  return database.query<FoundMatter>(
    `select ${LINE},
       json_build_object('id', b.id, 'reference', b.reference, 'name', b.name, 'address', b.address,
         'version', b.version, 'isInRegister', b.removed_at is null) as building,
       m.opened_by as "openedBy",
       (o.shut_out_at is null and party.erased_at is null) as "isMailed",
       (${MESSAGES}) as messages
     ${FROM} join people o on o.id = m.opened_by
     where m.scheme_id = $1 and ($2::uuid is null or m.id = $2)
       and ($3::uuid[] is null or m.party_id = any($3))
     order by m.opened_at desc, m.id limit ${MOST}`,
    { type: QueryTypes.SELECT, bind: [schemeId, id ?? null, parties ?? null], transaction },
  );
}
