import { tmpdir } from 'node:os';
import path from 'node:path';
import { z } from 'zod';
import { emailSchema } from '../shared/schemas/passwords.ts';

const schema = z.object({
  NODE_ENV: z.enum(['development', 'production', 'test']).default('development'),
  HOST: z.string().default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65535).default(4600),
  /** The role that serves: no DDL. */
  DATABASE_URL: z.string().startsWith('postgres'),
  SESSION_SECRET: z.string().min(32),
  /** Where people reach the application, for links in mail. */
  PUBLIC_URL: z.url(),
  /** Demo people, demo scheme and the local mailbox. */
  DEMO: z.stringbool().default(false),
  /** Without the demo: who is asked in while no administrator can sign in. */
  FIRST_ADMINISTRATOR: emailSchema.optional(),
  FIRST_ADMINISTRATOR_NAME: z.string().trim().min(1).max(200).default('Administrator'),
  SMTP_URL: z.string().startsWith('smtp').optional(),
  MAIL_FROM: z.email().default('groundsill@example.org'),
  /** How many letters to owners and answers go out in a minute at most. */
  MAILS_PER_MINUTE: z.coerce.number().int().min(1).max(100_000).default(600),
  /**
   * Failed sign-ins, and letters asked for, in a quarter of an hour: so many for one e-mail address, ten
   * times as many from one IP address.
   */
  RATE_LIMIT: z.coerce.number().int().min(1).default(10),
  /** How many proxies stand before the server; what they say of the caller is believed. */
  TRUST_PROXY: z.coerce.number().int().min(0).default(0),
  /** Where files that are sent wait until they are read. */
  UPLOADS_FOLDER: z.string().min(1).default(path.join(tmpdir(), 'groundsill-uploads')),
  /** Where photographs of visits are kept, by what they hold. */
  PHOTOGRAPHS_FOLDER: z.string().min(1).default(path.join(tmpdir(), 'groundsill-photographs')),
  /** Where prints of evidence are kept, each by its id. */
  PRINTS_FOLDER: z.string().min(1).default(path.join(tmpdir(), 'groundsill-prints')),
  LOG_LEVEL: z.enum(['silent', 'error', 'warn', 'info', 'debug']).default('info'),
});

export type Env = Readonly<z.infer<typeof schema>>;

/** What migrating needs: the address of the role that owns, and who serves. */
const migrateSchema = schema.pick({ DATABASE_URL: true }).extend({
  MIGRATE_URL: z.string().startsWith('postgres'),
});

/** What working at runs beside the server needs. */
const workerSchema = schema.pick({ DATABASE_URL: true, LOG_LEVEL: true });

/** What filling the demo needs: a database, and the folder with the town's files. */
const seedSchema = schema.pick({ DATABASE_URL: true }).extend({ DEMO_FOLDER: z.string().min(1) });

function read<T>(wanted: z.ZodType<T>, source: NodeJS.ProcessEnv): T {
  const parsed = wanted.safeParse(source);
  if (parsed.success) return parsed.data;
  const faults = parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`The environment is not right.\n  ${faults.join('\n  ')}`);
}

/** Reads the environment once; every variable that is wrong is named. */
export function readEnv(source: NodeJS.ProcessEnv): Env {
  return read(schema, source);
}

export function readMigrateEnv(source: NodeJS.ProcessEnv): z.infer<typeof migrateSchema> {
  return read(migrateSchema, source);
}

export function readSeedEnv(source: NodeJS.ProcessEnv): z.infer<typeof seedSchema> {
  return read(seedSchema, source);
}

export function readWorkerEnv(source: NodeJS.ProcessEnv): z.infer<typeof workerSchema> {
  return read(workerSchema, source);
}
