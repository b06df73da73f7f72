import { funnelSchema, type Funnel } from '../../shared/schemas/decision-answers.ts';
import { DECISION_KINDS, STANDINGS } from '../../shared/schemas/decisions.ts';
import { REGISTER_ORDER } from '../../shared/schemas/register.ts';
import { countAssigned } from '../models/count-assigned.ts';
import { countHeld } from '../models/count-held.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { registerOf, type Register } from '../register/register-of.ts';
import { registerOrder } from '../register/register-order.ts';
import { standingOf } from '../register/standings.ts';
import type { Services } from '../services.ts';

type Kept = Pick<Services, 'database' | 'tiles'>;

/** The buildings at a stage, which are kept as long as register and run stay. */
async function idsAt(services: Kept, register: Register, stage: number): Promise<number[]> {
  const filter = { any: { stage: [String(stage)] } };
  const order = await registerOrder(services, register, { filter, sort: REGISTER_ORDER });
  return order.slice(0, order.count);
}

function counted<T extends string>(
  names: readonly T[],
  values: readonly (string | null)[],
): Record<T, number> {
  const counts = new Map<string | null, number>();
  for (const value of values) counts.set(value, (counts.get(value) ?? 0) + 1);
  return Object.fromEntries(names.map((name) => [name, counts.get(name) ?? 0])) as Record<
    T,
    number
  >;
}

async function count(services: Kept, register: Register): Promise<Omit<Funnel, 'mine' | 'heldBy'>> {
  const reading = { database: services.database, transaction: null };
  const [stateOf, kindOf, ...byStage] = await Promise.all([
    standingOf(reading, register, 'state'),
    standingOf(reading, register, 'decision'),
    ...[1, 2, 3].map((stage) => idsAt(services, register, stage)),
  ]);
  const decided = byStage.flat().filter((id) => stateOf(id) === 'decided');
  const kinds = counted(DECISION_KINDS, decided.map(kindOf));
  const stages = byStage.map((ids) => ({
    buildings: ids.length,
    standings: counted(STANDINGS, ids.map(stateOf)),
  }));
  return {
    runId: register.runId,
    buildings: byStage.reduce((all, ids) => all + ids.length, 0),
    stages: stages as unknown as Funnel['stages'],
    kinds: DECISION_KINDS.flatMap((kind) =>
      kinds[kind] === 0 ? [] : [{ kind, count: kinds[kind] }],
    ),
  };
}

function kept<T>({ tiles }: Kept, key: string, make: () => Promise<T>): Promise<unknown> {
  return tiles
    .get(key, async () => Buffer.from(JSON.stringify(await make())))
    .then((bytes): unknown => JSON.parse(bytes.toString()));
}

/**
 * How many buildings of the run that is shown stand where. Kept as long as tiles are, by the versions that
 * it hangs on.
 */
export async function funnelOf(
  services: Kept,
  { id: personId }: Pick<Actor, 'id'>,
  scheme: Scheme,
): Promise<Funnel> {
  const { database } = services;
  const register = await registerOf(services, scheme);
  const { version, runId, decisionsVersion } = register;
  const key = `${scheme.id}/${version}/${runId}`;
  const [counts, heldBy, mine] = await Promise.all([
    kept(services, `funnel/${key}/${decisionsVersion}`, () => count(services, register)),
    kept(services, `held/${key}`, () => countHeld(database, runId)),
    countAssigned(database, scheme.id, personId),
  ]);
  return funnelSchema.parse({ ...Object(counts), heldBy, mine });
}
