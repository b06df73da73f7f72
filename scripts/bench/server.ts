import { startBenchDatabase } from './bench-database.ts';
import { benchImports } from './imports.ts';
import { benchRegister } from './register.ts';

/** Prints the figures of the server, each part on the same throw-away database. */
export async function benchServer(): Promise<void> {
  const database = await startBenchDatabase();
  try {
    await benchRegister(database.url);
    await benchImports(database.url);
  } finally {
    database.remove();
  }
}
