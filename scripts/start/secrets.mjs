import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

/** The secrets of a data folder, made at the first start and kept: sessions outlive a restart. */
export function secretsOf(folder) {
  const file = path.join(folder, 'secrets.json');
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
  const secrets = { session: randomBytes(32).toString('base64url') };
  writeFileSync(file, JSON.stringify(secrets), { mode: 0o600 });
  return secrets;
}
