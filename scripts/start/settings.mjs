import path from 'node:path';
import { townFolder } from './folders.mjs';
import { Refusal } from './refusal.mjs';
import { secretsOf } from './secrets.mjs';

/** Whether demo people and their town are wanted: unless DEMO says no. */
export function isDemo() {
  return !['false', '0', 'no', 'off'].includes((process.env.DEMO ?? 'true').toLowerCase());
}

/** The environment of the server and its fellows; what the person has set comes first. */
export function settings({ folder, port, serverUrl, publicUrl }) {
  if (!isDemo() && process.env.SMTP_URL === undefined) {
    throw new Refusal('Without the demo, SMTP_URL must say where letters are handed in.');
  }
  return {
    NODE_ENV: 'production',
    LOG_LEVEL: 'warn',
    PUBLIC_URL: publicUrl,
    SESSION_SECRET: secretsOf(folder).session,
    UPLOADS_FOLDER: path.join(folder, 'uploads'),
    PHOTOGRAPHS_FOLDER: path.join(folder, 'photographs'),
    PRINTS_FOLDER: path.join(folder, 'prints'),
    ...process.env,
    PORT: String(port),
    DATABASE_URL: serverUrl,
    DEMO: String(isDemo()),
    DEMO_FOLDER: townFolder(),
  };
}
