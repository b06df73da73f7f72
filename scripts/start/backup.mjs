import { existsSync, renameSync, rmSync, statSync } from 'node:fs';
import path from 'node:path';
import { dump } from '../postgres/dump.mjs';
import { withOwnedDatabase } from './owned-database.mjs';
import { Refusal, withSentences } from './refusal.mjs';

/** Writes the database to a file, also while it is being served from. */
export function backup([name, ...more]) {
  return withSentences(async () => {
    if (name === undefined || more.length > 0) {
      throw new Refusal('Say where to: npm run backup -- groundsill.dump');
    }
    const file = path.resolve(name);
    if (existsSync(file)) throw new Refusal(`${file} is there already. Choose another name.`);
    const unfinished = `${file}.unfinished`;
    // it holds what only the database's owner may read
    process.umask(0o077);
    try {
      await withOwnedDatabase({ alone: false }, (url) => dump(url, unfinished));
      renameSync(unfinished, file);
    } finally {
      rmSync(unfinished, { force: true });
    }
    console.log(`Written: ${file} (${(statSync(file).size / 1e6).toFixed(1)} MB)`);
  });
}
