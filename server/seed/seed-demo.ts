import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { hashPassword } from '../authentication/password-hash.ts';
import { defaultRules } from '../commands/default-rules.ts';
import { changeRegister } from '../commands/change-register.ts';
import { insertAlignment } from '../commands/insert-alignment.ts';
import { recordChange } from '../commands/record-change.ts';
import { Membership } from '../models/membership.ts';
import { Person } from '../models/person.ts';
import { SchemeRules } from '../models/scheme-rules.ts';
import { Scheme } from '../models/scheme.ts';
import { DEMO_ALIGNMENTS } from './demo-alignments.ts';
import {
  DEMO_ADMINISTRATOR,
  DEMO_MEMBERS,
  DEMO_PASSWORD,
  DEMO_PEOPLE,
  type DemoPerson,
} from './demo-people.ts';
import { writeLetterSettings } from './demo-letter-settings.ts';
import { giveOwnerAHouse } from './owner-of-house.ts';
import { readTown } from './read-town.ts';
import { writeBackground } from './write-background.ts';
import { dayOf } from '../days.ts';

/** Any number; who holds its lock looks whether the demo is there, and fills it in. */
const LOCK = 20_260_102;

const DEMO_SCHEME = {
  name: 'Port Dogger crossing',
  description:
    'A twin-bore metro under the old harbour of Port Dogger, with one station box, two shafts and ' +
    'three options for the crossing. The town and everybody in it are invented.',
  crs: 32631,
};

/** Whether a database is the demo already, is nobody's yet, or is somebody else's. */
export type Seeding = 'filled' | 'there' | 'not ours';

async function stateOf(transaction: Transaction): Promise<'empty' | 'there' | 'not ours'> {
  const people = await Person.findAll({ attributes: ['email'], transaction });
  const emails = new Set(people.map(({ email }) => email));
  if (emails.size === 0) return 'empty';
  return DEMO_PEOPLE.every(({ email }) => emails.has(email)) ? 'there' : 'not ours';
}

async function createPerson(
  { email, name, isAdministrator }: DemoPerson,
  transaction: Transaction,
): Promise<Person> {
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  const person = await Person.create(
    { email, name, isAdministrator, passwordHash },
    { transaction },
  );
  const subject = { kind: 'person', id: person.id };
  const after = { name, email, isAdministrator };
  await recordChange({ by: null, action: 'create person', subject, after }, transaction);
  return person;
}

async function giveRoles(
  schemeId: string,
  person: Person,
  roles: DemoPerson['roles'],
  transaction: Transaction,
): Promise<void> {
  const rows = roles.map((role) => ({ schemeId, personId: person.id, role }));
  await Membership.bulkCreate(rows, { transaction });
  const subject = { kind: 'person', id: person.id };
  const change = { by: null, schemeId, action: 'change roles', subject };
  await recordChange({ ...change, before: { roles: [] }, after: { roles } }, transaction);
}

async function createScheme(createdBy: string, transaction: Transaction): Promise<Scheme> {
  const scheme = await Scheme.create(DEMO_SCHEME, { transaction });
  const rules = defaultRules(dayOf(scheme.createdAt));
  await SchemeRules.create({ schemeId: scheme.id, version: 1, rules, createdBy }, { transaction });
  const subject = { kind: 'scheme', id: scheme.id };
  const change = { by: null, schemeId: scheme.id, action: 'create scheme', subject };
  await recordChange({ ...change, after: DEMO_SCHEME }, transaction);
  return scheme;
}

async function fill(townFolder: string, transaction: Transaction): Promise<void> {
  const administrator = await createPerson(DEMO_ADMINISTRATOR, transaction);
  const scheme = await createScheme(administrator.id, transaction);
  const owners: Person[] = [];
  for (const one of DEMO_MEMBERS) {
    const person = await createPerson(one, transaction);
    await giveRoles(scheme.id, person, one.roles, transaction);
    if (one.roles.includes('owner')) owners.push(person);
  }
  const cause = { kind: 'import', by: null, source: 'The demo town' } as const;
  const created = readTown(townFolder);
  await changeRegister(scheme.sequelize, scheme, cause, { created }, transaction);
  await writeBackground(scheme, townFolder, transaction);
  await writeLetterSettings(scheme, administrator, transaction);
  for (const owner of owners) await giveOwnerAHouse(scheme, owner, created, transaction);
  for (const option of DEMO_ALIGNMENTS) {
    await insertAlignment(scheme, null, option, 'create alignment', transaction);
  }
}

/** Fills an empty database with the demo: people, their town and its scheme, all or nothing. */
export function seedDemo(database: Sequelize, townFolder: string): Promise<Seeding> {
  return database.transaction(async (transaction) => {
    await database.query('select pg_advisory_xact_lock(:lock)', {
      replacements: { lock: LOCK },
      type: QueryTypes.SELECT,
      transaction,
    });
    const state = await stateOf(transaction);
    if (state !== 'empty') return state;
    await fill(townFolder, transaction);
    return 'filled';
  });
}
