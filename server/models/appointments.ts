import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type {
  Appointment,
  AppointmentState,
  AskedFor,
  NewAppointment,
} from '../../shared/schemas/appointments.ts';
import { standingParty } from './standing-party.ts';

/** An appointment with whom mail about it reaches, as its presenters want it. */
export type FoundAppointment = Omit<Appointment, 'startsAt' | 'changedAt' | 'isMailed'> & {
  readonly startsAt: Date;
  readonly changedAt: Date;
  /** The party, or whoever acts for it; null where neither has an e-mail address. */
  readonly reader: { readonly name: string; readonly email: string } | null;
};

const MOST = 1000;

type Which = {
  readonly id?: string;
  readonly building?: number | undefined;
  /** Only those of these parties. */
  readonly parties?: readonly string[];
};

/** The appointments of a scheme: those that wait for the team first, then what is to come, then the others. */
export function findAppointments(
  database: Sequelize,
  schemeId: string,
  { id, building, parties }: Which = {},
  transaction: Transaction | null = null,
): Promise<FoundAppointment[]> {
  return database.query<FoundAppointment>(
    `select a.id, a.purpose, a.starts_at as "startsAt", a.minutes, a.place, a.state,
       a.asked_for as "askedFor", a.version, a.changed_at as "changedAt", c.name as "createdBy",
       json_build_object('id', b.id, 'reference', b.reference, 'name', b.name, 'address', b.address)
         as building,
       json_build_object('id', p.id, 'name', p.name) as party,
       case
         when p.erased_at is not null then null
         when r.id is not null and coalesce(r.email, rp.email) is not null
           then json_build_object('name', r.name, 'email', coalesce(r.email, rp.email))
         when coalesce(p.email, pp.email) is not null
           then json_build_object('name', p.name, 'email', coalesce(p.email, pp.email))
       end as reader
     from appointments a
     join buildings b on b.id = a.building_id
     cross join lateral (${standingParty('a.party_id')}) p
     left join people pp on pp.id = p.person_id and pp.shut_out_at is null
     left join parties r on r.id = p.represented_by and r.merged_into is null and r.erased_at is null
     left join people rp on rp.id = r.person_id and rp.shut_out_at is null
     join people c on c.id = a.created_by
     where a.scheme_id = $1 and ($2::uuid is null or a.id = $2)
       and ($3::integer is null or a.building_id = $3)
       and ($4::uuid[] is null or a.party_id = any($4))
     order by a.state <> 'another day asked for', a.state in ('cancelled', 'done'),
       case when a.state in ('cancelled', 'done') then null else a.starts_at end,
       a.starts_at desc, a.id
     limit ${MOST}`,
    {
      type: QueryTypes.SELECT,
      bind: [schemeId, id ?? null, building ?? null, parties ?? null],
      transaction,
    },
  );
}

/** Keeps a new appointment. */
export async function insertAppointment(
  database: Sequelize,
  appointment: NewAppointment & { readonly schemeId: string; readonly by: string },
  transaction: Transaction,
): Promise<void> {
  const { id, schemeId, buildingId, partyId, purpose, startsAt, minutes, place, by } = appointment;
  await database.query(
    `insert into appointments (id, scheme_id, building_id, party_id, purpose, starts_at, minutes, place,
       created_by)
     values ($1, $2, $3, $4, $5, $6, $7, $8, $9)`,
    {
      bind: [id, schemeId, buildingId, partyId, purpose, new Date(startsAt), minutes, place, by],
      transaction,
    },
  );
}

/** What of an appointment moves. */
export type MovedAppointment = {
  readonly startsAt: Date;
  readonly minutes: number;
  readonly place: string;
  readonly state: AppointmentState;
  readonly askedFor: AskedFor | null;
};

/** Moves an appointment on by one version. */
export async function updateAppointment(
  database: Sequelize,
  id: string,
  { startsAt, minutes, place, state, askedFor }: MovedAppointment,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `update appointments set starts_at = $2, minutes = $3, place = $4, state = $5,
       asked_for = $6::jsonb, version = version + 1, changed_at = now()
     where id = $1`,
    {
      bind: [id, startsAt, minutes, place, state, askedFor && JSON.stringify(askedFor)],
      transaction,
    },
  );
}

/** Whether a live party of a scheme has an interest in a building of its register today. */
export async function hasInterest(
  database: Sequelize,
  schemeId: string,
  { buildingId, partyId }: { readonly buildingId: number; readonly partyId: string },
  transaction: Transaction,
): Promise<boolean> {
  const found = await database.query(
    `select from interests i
     join parties p on p.id = i.party_id
     join buildings b on b.id = i.building_id
     where i.party_id = $2 and i.building_id = $3
       and p.scheme_id = $1 and p.merged_into is null and p.erased_at is null
       and b.scheme_id = $1 and b.removed_at is null
       and coalesce(i.from_day <= current_date, true) and coalesce(i.to_day >= current_date, true)
     limit 1`,
    { type: QueryTypes.SELECT, bind: [schemeId, partyId, buildingId], transaction },
  );
  return found.length > 0;
}
