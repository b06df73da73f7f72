import { Refusal } from './refusal.mjs';

/** Fills the demo in, and gives who may sign in to it. */
export async function seed(run) {
  const { said, ...signIns } = await run('seed');
  if (said !== 'not ours') return { said, signIns };
  throw new Refusal(
    'This database holds people and is not the demo. To serve it as it is, set DEMO=false.',
  );
}
