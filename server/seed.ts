import { connectDatabase } from './database/connect.ts';
import { readSeedEnv } from './env.ts';
import { report } from './report.ts';
import { DEMO_PASSWORD, DEMO_PEOPLE } from './seed/demo-people.ts';
import { seedDemo } from './seed/seed-demo.ts';

/** Fills a database with the demo, unless it is there, and says who may sign in. */
async function seed(): Promise<void> {
  const env = readSeedEnv(process.env);
  const database = connectDatabase(env.DATABASE_URL);
  try {
    const said = await seedDemo(database, env.DEMO_FOLDER);
    const people = DEMO_PEOPLE.map(({ email, name }) => ({ email, name }));
    report({ said, password: DEMO_PASSWORD, people });
  } finally {
    await database.close();
  }
}

await seed();
