import type { Logger } from 'pino';
import type { Env } from '../env.ts';
import { createMailer, type Mailer } from './mailer.ts';
import { startSink } from './sink.ts';

/** The way out for letters: SMTP_URL, or in the demo a mailbox of our own that keeps them. */
export async function openMail(
  env: Env,
  logger: Logger,
): Promise<{ mailer: Mailer; close: () => Promise<void> }> {
  const { SMTP_URL, DEMO } = env;
  if (SMTP_URL !== undefined) {
    return { mailer: createMailer(SMTP_URL, env), close: () => Promise.resolve() };
  }
  if (!DEMO) throw new Error('Without the demo, SMTP_URL must say where letters are handed in.');
  const sink = await startSink({ logger });
  return { mailer: createMailer(sink.url, env), close: sink.close };
}
