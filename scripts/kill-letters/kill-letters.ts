import { randomUUID } from 'node:crypto';
import { setTimeout as sleep } from 'node:timers/promises';
import { QueryTypes, type Sequelize } from 'sequelize';
import { checkLetters } from '../../server/commands/check-letters.ts';
import { prepareLetters } from '../../server/commands/prepare-letters.ts';
import { sendLetters } from '../../server/commands/send-letters.ts';
import { connectDatabase } from '../../server/database/connect.ts';
import { createLogger } from '../../server/logger.ts';
import type { OutgoingMail } from '../../server/mail/outbox.ts';
import { startSink } from '../../server/mail/sink.ts';
import { Membership } from '../../server/models/membership.ts';
import { insertMails } from '../../server/models/outbox-mails.ts';
import { Person } from '../../server/models/person.ts';
import type { Scheme } from '../../server/models/scheme.ts';
import {
  insertInterests,
  insertParties,
  type NewParty,
} from '../../server/models/write-parties.ts';
import type { NewBatch } from '../../shared/schemas/letter-batches.ts';
import { startBenchDatabase } from '../bench/bench-database.ts';
import { seededRandom } from '../bench/seeded-random.ts';
import { townToRun } from '../bench/town-to-run.ts';
import { killableProcesses } from '../kill-runs/killable-processes.ts';

const LETTERS = Number(process.env.LETTERS ?? 5000);
const KILLS = Number(process.env.KILLS ?? 20);
const SEED = Number(process.env.SEED ?? 1);
/** Between kills; long enough for some of the letters to go out, so that kills fall all over the batch. */
const LONGEST_WAIT_MS = 20_000;

async function anAssessor(scheme: Scheme, name: string): Promise<Person> {
  const person = await Person.create({ email: `${name}@trial.example.org`, name });
  await Membership.create({ schemeId: scheme.id, personId: person.id, role: 'assessor' });
  return person;
}

/** So many parties, each with a house of its own. */
async function fillParties(database: Sequelize, scheme: Scheme): Promise<string[]> {
  const buildings = await database.query<{ id: number }>(
    'select id from buildings where scheme_id = $1 order by id limit $2',
    { type: QueryTypes.SELECT, bind: [scheme.id, LETTERS] },
  );
  const parties = buildings.map(({ id: buildingId }, k) => {
    const party: NewParty = {
      id: randomUUID(),
      kind: 'person',
      name: `Owner ${k + 1}`,
      address: [`House ${k + 1}`],
      email: `owner-${k + 1}@trial.example.org`,
      channel: 'e-mail',
      representedBy: null,
    };
    return { buildingId, party };
  });
  await database.transaction(async (transaction) => {
    const fields = parties.map(({ party }) => party);
    await insertParties(database, scheme.id, fields, transaction);
    const interest = { kind: 'freeholder', from: null, to: null } as const;
    const held = parties.map(({ party, buildingId }) => {
      return { ...interest, id: randomUUID(), partyId: party.id, buildingId };
    });
    await insertInterests(database, held, transaction);
  });
  return parties.map(({ party }) => party.id);
}

/** A batch that was prepared, checked and sent; whoever starts next finds its mails in the outbox. */
async function sendAll(database: Sequelize, scheme: Scheme): Promise<void> {
  const [first, second] = [await anAssessor(scheme, 'first'), await anAssessor(scheme, 'second')];
  const by = ({ id }: Person) => ({ id, isAdministrator: false });
  const chosen = (await fillParties(database, scheme)).map((partyId) => ({
    partyId,
    why: 'Trial',
  }));
  const kind = 'first information';
  const asked: NewBatch = { kind, leftOut: [], chosen, text: null, expected: chosen.length };
  const batchId = await prepareLetters({ database }, by(first), scheme, asked);
  const check = { batchId, verdict: 'checked', comment: '' } as const;
  await checkLetters({ database }, by(second), scheme, check);
  const outbox = {
    put: (mails: readonly OutgoingMail[], transaction: never) =>
      insertMails(database, mails.map((mail) => ({ ...mail, id: randomUUID() })), transaction), // prettier-ignore
    recover: () => Promise.resolve(0),
  };
  const env = { SESSION_SECRET: 'a secret of thirty-two letters or more', PUBLIC_URL: 'http://127.0.0.1:4600' }; // prettier-ignore
  const tools = { database, outbox, env } as never;
  await sendLetters(tools, by(second), scheme, batchId);
}

type Counts = {
  readonly waiting: number;
  readonly sent: number;
  readonly again: number;
  readonly failed: number;
  readonly tries: number;
  readonly mailbox: number;
  readonly twice: number;
  readonly lost: number;
};

async function countAll(database: Sequelize): Promise<Counts> {
  const [counts] = await database.query<Counts>(
    `select
       count(*) filter (where o.state = 'waiting')::integer as waiting,
       count(*) filter (where o.state = 'sent')::integer as sent,
       count(*) filter (where o.was_sent_again)::integer as again,
       count(*) filter (where o.state = 'failed')::integer as failed,
       (select count(*)::integer from outbox_tries) as tries,
       (select count(*)::integer from mailbox_letters) as mailbox,
       (select count(*)::integer from (
         select from mailbox_letters group by recipient having count(*) > 1) as double) as twice,
       count(*) filter (where o.state = 'sent' and not exists (
         select from mailbox_letters m where m.message_id = '<' || o.id || '@example.org>'
       ))::integer as lost
     from outbox o`,
    { type: QueryTypes.SELECT },
  );
  if (counts === undefined) throw new Error('Nothing can be counted.');
  return counts;
}

async function trial(database: Sequelize, url: string, smtpUrl: string): Promise<boolean> {
  console.log(`A batch of ${LETTERS} letters by mail, ${KILLS} kills, seed ${SEED}.`);
  const { scheme } = await townToRun(database, LETTERS);
  await sendAll(database, scheme);
  const random = seededRandom(SEED);
  const { launch, kill } = killableProcesses(url, {
    SMTP_URL: smtpUrl,
    MAILS_PER_MINUTE: '100000',
  });
  try {
    await launch('index');
    for (let k = 1; k <= KILLS; k += 1) {
      await sleep(500 + random() * LONGEST_WAIT_MS);
      await kill('index', 'SIGKILL');
      const { sent, mailbox } = await countAll(database);
      console.log(`kill ${k}: ${sent} on record as sent, ${mailbox} in the mailbox`);
      await launch('index');
    }
    for (;;) {
      if ((await countAll(database)).waiting === 0) break;
      await sleep(500);
    }
    const end = await countAll(database);
    console.log(`${end.sent} sent, ${end.failed} failed, ${end.tries} tries; ${end.again} sent again after a stop.`); // prettier-ignore
    console.log(
      `In the mailbox: ${end.mailbox}; not there: ${end.lost}; there twice: ${end.twice}.`,
    );
    return end.sent === LETTERS && end.mailbox === LETTERS && end.lost === 0 && end.twice === 0;
  } finally {
    await kill('index', 'SIGTERM');
  }
}

/** Kills the server at random moments of sending a batch, and tells whether each letter arrived, once. */
export async function killLetters(): Promise<boolean> {
  const { url, remove } = await startBenchDatabase();
  const database = connectDatabase(url);
  const sink = await startSink({ logger: createLogger({ LOG_LEVEL: 'error' }) });
  try {
    const isWell = await trial(database, url, sink.url);
    console.log(isWell ? 'None is lost and none shows twice.' : 'SOMETHING IS WRONG.');
    return isWell;
  } finally {
    await sink.close();
    await database.close();
    remove();
  }
}
