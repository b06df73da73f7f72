import { setTimeout as sleep } from 'node:timers/promises';
import { QueryTypes, type Sequelize } from 'sequelize';
import { startRun } from '../../server/commands/start-run.ts';
import { connectDatabase } from '../../server/database/connect.ts';
import { findProgress } from '../../server/models/run-chunks.ts';
import { startBenchDatabase } from '../bench/bench-database.ts';
import { seededRandom } from '../bench/seeded-random.ts';
import { townToRun } from '../bench/town-to-run.ts';
import { killableProcesses, type ProcessName } from './killable-processes.ts';

const BUILDINGS = 20_000;
const KILLS = 10;
const SEED = Number(process.env.SEED ?? 1);

/** Where two runs differ in any figure of any building: none, where both are whole and right. */
async function differences(database: Sequelize, one: string, other: string): Promise<number> {
  const figures = `select to_jsonb(r) - 'run_id' as figures from run_results r where run_id =`;
  const [row] = await database.query<{ count: number }>(
    `select count(*)::integer as count from (
       (${figures} $1 except all ${figures} $2) union all (${figures} $2 except all ${figures} $1)
     ) as different`,
    { type: QueryTypes.SELECT, bind: [one, other] },
  );
  return row?.count ?? NaN;
}

async function trial(database: Sequelize, url: string): Promise<boolean> {
  console.log(`A town of ${BUILDINGS}, seed ${SEED}.`);
  const { scheme, option } = await townToRun(database, BUILDINGS);
  const asked = { alignmentId: option.id, alignmentVersion: option.version };
  // whoever starts next finds it begun, and goes on
  const tools = { database, runs: { send: () => Promise.resolve() } as never };
  const random = seededRandom(SEED);
  const { launch, kill } = killableProcesses(url);
  const state = async (id: string) => (await findProgress(database, id))?.state;

  async function untilComplete(id: string): Promise<void> {
    for (let now = await state(id); now !== 'complete'; now = await state(id)) {
      if (now === 'failed' || now === 'cancelled') throw new Error(`The run is ${now}.`);
      await sleep(200);
    }
  }

  let kills = 0;
  const runs: string[] = [];
  try {
    while (kills < KILLS) {
      const { id } = await startRun(tools, null, scheme, asked);
      runs.push(id);
      await Promise.all([launch('index'), launch('worker')]);
      while (kills < KILLS && (await state(id)) !== 'complete') {
        await sleep(200 + random() * 2500);
        const name: ProcessName = random() < 0.5 ? 'index' : 'worker';
        await kill(name, 'SIGKILL');
        kills += 1;
        const progress = await findProgress(database, id);
        console.log(`kill ${kills}: ${name === 'index' ? 'server' : 'worker'} at ${progress?.done ?? 0} of ${BUILDINGS}, ${progress?.state ?? ''}`); // prettier-ignore
        await launch(name);
      }
      await untilComplete(id);
      await Promise.all([kill('index', 'SIGTERM'), kill('worker', 'SIGTERM')]);
    }
    const quiet = await startRun(tools, null, scheme, asked);
    await launch('index');
    await untilComplete(quiet.id);
    let isWell = true;
    for (const id of runs) {
      const progress = await findProgress(database, id);
      const different = await differences(database, id, quiet.id);
      isWell &&= progress?.done === BUILDINGS && different === 0;
      console.log(`A run through kills: ${progress?.done ?? 0} of ${BUILDINGS} buildings, ${different} differ from a run left alone.`); // prettier-ignore
    }
    return isWell;
  } finally {
    await Promise.all([kill('index', 'SIGTERM'), kill('worker', 'SIGTERM')]);
  }
}

/** Kills server and worker at random moments of a run, and tells whether it came through whole. */
export async function killRuns(): Promise<boolean> {
  const { url, remove } = await startBenchDatabase();
  const database = connectDatabase(url);
  try {
    const isWell = await trial(database, url);
    console.log(isWell ? 'Nothing is missing and nothing is doubled.' : 'SOMETHING IS WRONG.');
    return isWell;
  } finally {
    await database.close();
    remove();
  }
}
