import { pino, type DestinationStream, type Logger } from 'pino';
import type { Env } from './env.ts';

/** The log: one JSON line an event; no cookies, passwords or tokens. */
export function createLogger(
  { LOG_LEVEL }: Pick<Env, 'LOG_LEVEL'>,
  destination?: DestinationStream,
): Logger {
  const redact = ['req.headers.cookie', 'req.headers["x-csrf-token"]', 'res.headers["set-cookie"]'];
  return pino({ level: LOG_LEVEL, redact }, destination);
}
