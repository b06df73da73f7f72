import { readFileSync } from 'node:fs';

/** The account that PostgreSQL runs as when we are root, which it refuses; undefined otherwise. */
export function unprivilegedUser() {
  if (process.getuid() !== 0) return undefined;
  const accounts = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .map((line) => line.split(':'));
  for (const name of ['postgres', 'nobody']) {
    const account = accounts.find(([found]) => found === name);
    if (account) return { uid: Number(account[2]), gid: Number(account[3]) };
  }
  throw new Error(
    'PostgreSQL does not run as root and there is no account "postgres" or "nobody".',
  );
}
