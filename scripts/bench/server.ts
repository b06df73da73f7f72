import { loadavg } from 'node:os';
import { startBenchDatabase } from './bench-database.ts';
import { hostileTimes } from './hostile-times.ts';
import { benchImports } from './imports.ts';
import { benchRegister } from './register.ts';
import { benchRuns } from './runs.ts';

async function onOwnDatabase(bench: (url: string) => Promise<void>): Promise<void> {
  const database = await startBenchDatabase();
  try {
    await bench(database.url);
  } finally {
    database.remove();
  }
}

/** Prints the figures of the server. Imports come first, so that no other part's memory is counted in. */
export async function benchServer(): Promise<void> {
  console.log(`load of the machine: ${(loadavg()[0] ?? NaN).toFixed(1)}`);
  await onOwnDatabase(benchImports);
  await onOwnDatabase(benchRegister);
  await onOwnDatabase(benchRuns);
  for (const line of await hostileTimes()) console.log(line);
}
