import { QueryTypes, type Sequelize } from 'sequelize';

/** Everything that hangs on parties, table by table, in words of the tables. */
const TABLES = {
  letters: `select l.id, b.kind, b.number as batch, l.number, b.state, b.sent_at, l.channel, l.name,
      l.address, l.email, l.subject, l.body, l.facts, l.reasons, l.answer_by,
      a.acknowledged_at, a.how as acknowledged_how
    from letters l join letter_batches b on b.id = l.batch_id
    left join letter_acknowledgements a on a.letter_id = l.id
    where l.party_id = any($1::uuid[]) order by b.number, l.number`,
  exceptions: `select e.reasons, e.why, b.kind, b.number as batch
    from letter_exceptions e join letter_batches b on b.id = e.batch_id
    where e.party_id = any($1::uuid[]) order by b.number`,
  matters: `select m.number, m.kind, m.title, m.suggestion, m.state, m.due, m.opened_at,
      h.reference as building, coalesce((
        select json_agg(json_build_object('at', t.written_at, 'side', t.side, 'text', t.text)
          order by t.written_at, t.id)
        from matter_messages t where t.matter_id = m.id), '[]') as messages
    from matters m join buildings h on h.id = m.building_id
    where m.party_id = any($1::uuid[]) order by m.number`,
  appointments: `select a.purpose, a.starts_at, a.minutes, a.place, a.state, a.asked_for,
      h.reference as building
    from appointments a join buildings h on h.id = a.building_id
    where a.party_id = any($1::uuid[]) order by a.starts_at, a.id`,
  undertakings: `select number, promise, made_to, source, due, done_on, evidence
    from undertakings where party_id = any($1::uuid[]) order by number`,
} as const;

/** What is held beside the records of parties: letters, what they brought up, appointments, promises. */
export async function findPersonalData(
  database: Sequelize,
  partyIds: readonly string[],
): Promise<Readonly<Record<keyof typeof TABLES, readonly object[]>>> {
  const find = (name: keyof typeof TABLES) =>
    database.query<object>(TABLES[name], { type: QueryTypes.SELECT, bind: [partyIds] });
  const [letters, exceptions, matters, appointments, undertakings] = await Promise.all([
    find('letters'),
    find('exceptions'),
    find('matters'),
    find('appointments'),
    find('undertakings'),
  ]);
  return { letters, exceptions, matters, appointments, undertakings };
}
