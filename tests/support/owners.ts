import { randomUUID } from 'node:crypto';
import type { Sequelize } from 'sequelize';
import type { LetterTextPart } from '../../shared/presentation/letter-text.ts';
import type { Person } from '../../server/models/person.ts';
import type { Scheme } from '../../server/models/scheme.ts';
import { aMember } from './factories.ts';

/** A person who signs in as an owner, and is a party with an interest in some buildings. */
export async function anOwner(
  scheme: Scheme,
  name: string,
  buildings: readonly number[],
): Promise<{ person: Person; partyId: string }> {
  const { sequelize: database } = scheme;
  const person = await aMember(scheme, 'owner');
  const partyId = randomUUID();
  await database.query(
    `insert into parties (id, scheme_id, kind, name, address, email, channel, person_id)
     values ($1, $2, 'person', $3, $4, $5, 'e-mail', $6)`,
    { bind: [partyId, scheme.id, name, `${name}, Port Dogger`, person.email, person.id] },
  );
  await database.query(
    `insert into interests (id, party_id, building_id, kind)
     select gen_random_uuid(), $1, id, 'freeholder' from unnest($2::integer[]) as id`,
    { bind: [partyId, buildings] },
  );
  return { person, partyId };
}

type Written = {
  readonly partyId: string;
  readonly buildings: readonly number[];
  readonly subject?: string;
  readonly parts?: readonly LetterTextPart[];
};

async function insertLetters(
  database: Sequelize,
  schemeId: string,
  batchId: string,
  letters: readonly Written[],
): Promise<string[]> {
  const ids: string[] = [];
  for (const [
    k,
    { partyId, buildings, subject = 'A letter', parts = ['Dear owner'] },
  ] of letters.entries()) {
    const id = randomUUID();
    await database.query(
      `insert into letters (id, scheme_id, batch_id, number, party_id, channel, name, address, email,
         subject, body, facts, reasons, answer_by)
       select $1, $2, $3, $4, p.id, 'e-mail', p.name, p.address, p.email, $6, '', $7::jsonb, '[]',
         '2027-01-15'
       from parties p where p.id = $5`,
      { bind: [id, schemeId, batchId, k + 1, partyId, subject, JSON.stringify({ parts })] },
    );
    await database.query(
      'insert into letter_buildings (letter_id, building_id) select $1, unnest($2::integer[])',
      { bind: [id, buildings] },
    );
    ids.push(id);
  }
  return ids;
}

/** Letters of a batch that was sent, or that only waits for its check; their numbers. */
export async function someLetters(
  scheme: Scheme,
  {
    runId,
    isSent = true,
    letters,
  }: {
    readonly runId: string | null;
    readonly isSent?: boolean;
    readonly letters: readonly Written[];
  },
): Promise<string[]> {
  const { sequelize: database } = scheme;
  const [author, checker] = [await aMember(scheme, 'assessor'), await aMember(scheme, 'assessor')];
  const batchId = randomUUID();
  await database.query(
    `insert into letter_batches (id, scheme_id, number, kind, template_version, settings_version,
       run_id, letters, prepared_by)
     values ($1, $2, (select count(*) + 1 from letter_batches where scheme_id = $2),
       'first information', 1, 1, $3, $4, $5)`,
    { bind: [batchId, scheme.id, runId, letters.length, author.id] },
  );
  const ids = await insertLetters(database, scheme.id, batchId, letters);
  if (!isSent) return ids;
  await database.query(
    `update letter_batches set state = 'checked', checked_by = $2, checked_at = now() where id = $1`,
    { bind: [batchId, checker.id] },
  );
  await database.query(
    `update letter_batches set state = 'sent', sent_by = $2, sent_at = now() where id = $1`,
    { bind: [batchId, author.id] },
  );
  return ids;
}
