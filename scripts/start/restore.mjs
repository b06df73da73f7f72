import { existsSync } from 'node:fs';
import path from 'node:path';
import { parseArgs } from 'node:util';
import { load, query, withDatabase } from '../postgres/dump.mjs';
import { withOwnedDatabase } from './owned-database.mjs';
import { Refusal, withSentences } from './refusal.mjs';

const TABLES = `select count(*) from pg_tables where schemaname = 'public'`;

function quoted(name) {
  return `"${name.replaceAll('"', '""')}"`;
}

/** Rights on the database itself are not in the file. */
const RIGHTS = `do $$ begin
  execute format('revoke temporary on database %I from public', current_database());
end $$`;

function fill(url, file) {
  load(url, file);
  query(url, RIGHTS);
}

/** Reads the file into a new database beside, which takes the place of the old one once it is whole. */
function replace(url, file) {
  const name = decodeURIComponent(new URL(url).pathname.slice(1));
  const [beside, old] = [`${name}_restored`, `${name}_replaced`];
  const postgres = withDatabase(url, 'postgres');
  query(postgres, `drop database if exists ${quoted(beside)}`);
  query(postgres, `create database ${quoted(beside)}`);
  try {
    fill(withDatabase(url, beside), file);
    // refused while somebody is connected
    query(postgres, `alter database ${quoted(name)} rename to ${quoted(old)}`);
  } catch (error) {
    query(postgres, `drop database ${quoted(beside)}`);
    throw error;
  }
  query(postgres, `alter database ${quoted(beside)} rename to ${quoted(name)}`);
  query(postgres, `drop database ${quoted(old)}`);
}

function restoreInto(url, file, replacing) {
  if (query(url, TABLES) === '0') {
    fill(url, file);
    return;
  }
  if (!replacing) {
    throw new Refusal(
      'There is data here already. To give it up for what is in the file, add --replace.',
    );
  }
  replace(url, file);
}

/** Reads the database from a file of `npm run backup`; what fails leaves the old one standing. */
export function restore(args) {
  return withSentences(async () => {
    const { values, positionals } = parseArgs({
      args,
      options: { replace: { type: 'boolean', default: false } },
      allowPositionals: true,
    });
    const [name, ...more] = positionals;
    if (name === undefined || more.length > 0) {
      throw new Refusal('Say where from: npm run restore -- groundsill.dump [--replace]');
    }
    const file = path.resolve(name);
    if (!existsSync(file)) throw new Refusal(`There is no ${file}.`);
    await withOwnedDatabase({ alone: true }, (url) => {
      try {
        restoreInto(url, file, values.replace);
      } catch (error) {
        throw new Refusal(`${error.message.trim()}\nThe database stands as it was.`);
      }
    });
    console.log(`Restored from ${file}`);
  });
}
