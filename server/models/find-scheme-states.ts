import { QueryTypes, type Sequelize } from 'sequelize';
import type { Role } from '../../shared/schemas/roles.ts';

/** What of a scheme there is yet. */
export type SchemeState = {
  readonly id: string;
  readonly hasBuildings: boolean;
  readonly hasBackground: boolean;
  /** Every role that somebody holds. */
  readonly filled: readonly Role[];
  readonly invited: number;
  /** When the first of those was invited who have not accepted yet. */
  readonly invitedSince: Date | null;
};

/** Whether somebody has still to accept: neither done nor shut out, and the invitation not withdrawn. */
const AWAITED = `p.password_hash is null and p.shut_out_at is null and coalesce(
  (select bool_or(l.used_at is null) from single_use_links l
   where l.person_id = p.id and l.purpose = 'invitation'), true)`;

/** How far some schemes are set up, in one question to the database. */
export async function findSchemeStates(
  database: Sequelize,
  ids: readonly string[],
): Promise<SchemeState[]> {
  return database.query<SchemeState>(
    `select s.id,
       exists (select from buildings b where b.scheme_id = s.id and b.removed_at is null) as "hasBuildings",
       exists (select from background_features f where f.scheme_id = s.id) as "hasBackground",
       coalesce(array_agg(distinct m.role) filter (where m.role is not null), '{}') as filled,
       count(distinct p.id)::integer as invited,
       min(p.created_at) as "invitedSince"
     from schemes s
       left join memberships m on m.scheme_id = s.id
       left join people p on p.id = m.person_id and ${AWAITED}
     where s.id = any($1)
     group by s.id`,
    { type: QueryTypes.SELECT, bind: [ids] },
  );
}

/** People in no scheme who have not accepted their invitation. */
export async function findInvitedOutside(
  database: Sequelize,
): Promise<{ readonly invited: number; readonly since: Date | null }> {
  const [row] = await database.query<{ invited: number; since: Date | null }>(
    `select count(*)::integer as invited, min(p.created_at) as since
     from people p
     where ${AWAITED} and p.id not in (select person_id from memberships)`,
    { type: QueryTypes.SELECT },
  );
  return row ?? { invited: 0, since: null };
}
