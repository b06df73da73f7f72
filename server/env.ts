import { z } from 'zod';

const schema = z.object({
  NODE_ENV: z.enum(['development', 'production', 'test']).default('development'),
  HOST: z.string().default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65535).default(4600),
  /** The role that serves: no DDL. */
  DATABASE_URL: z.string().startsWith('postgres'),
  /** The role that owns and migrates; only `migrate` needs it. */
  MIGRATE_URL: z.string().startsWith('postgres').optional(),
  SESSION_SECRET: z.string().min(32),
  /** Where people reach the application, for links in mail. */
  PUBLIC_URL: z.url(),
  /** Demo people, demo scheme and the local mailbox. */
  DEMO: z.stringbool().default(false),
  SMTP_URL: z.string().startsWith('smtp').optional(),
  MAIL_FROM: z.email().default('groundsill@example.org'),
  LOG_LEVEL: z.enum(['silent', 'error', 'warn', 'info', 'debug']).default('info'),
});

export type Env = Readonly<z.infer<typeof schema>>;

/** Reads the environment once; every variable that is wrong is named. */
export function readEnv(source: NodeJS.ProcessEnv): Env {
  const parsed = schema.safeParse(source);
  if (parsed.success) return parsed.data;
  const faults = parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`The environment is not right.\n  ${faults.join('\n  ')}`);
}
