import { funnelSchema, type Funnel } from '../../shared/schemas/decision-answers.ts';
import { DECISION_KINDS, STANDINGS } from '../../shared/schemas/decisions.ts';
import { REGISTER_ORDER } from '../../shared/schemas/register.ts';
import { countAssigned } from '../models/count-assigned.ts';
import { countHeld } from '../models/count-held.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { countsOf, meantBy, type RankedValues } from '../register/ranked.ts';
import { registerOf, type Register } from '../register/register-of.ts';
import { registerOrder } from '../register/register-order.ts';
import { readingOf, valuesBeside } from '../register/values-beside.ts';
import type { Services } from '../services.ts';

type Kept = Pick<Services, 'database' | 'tiles'>;

/** The buildings at a stage, which are kept as long as register and run stay. */
async function idsAt(services: Kept, register: Register, stage: number): Promise<number[]> {
  const filter = { any: { stage: [String(stage)] } };
  const order = await registerOrder(services, register, { filter, sort: REGISTER_ORDER });
  return order.slice(0, order.count);
}

/** How many of some buildings have each of some names in a column. */
function counted<T extends string>(
  names: readonly T[],
  column: RankedValues,
  ids: Iterable<number>,
): Record<T, number> {
  const counts = new Map(countsOf(column, ids).map(({ value, count }) => [value, count]));
  return Object.fromEntries(names.map((name) => [name, counts.get(name) ?? 0])) as Record<
    T,
    number
  >;
}

async function count(services: Kept, register: Register): Promise<Omit<Funnel, 'mine' | 'heldBy'>> {
  const reading = readingOf(services);
  const [stateOf, kindOf, ...byStage] = await Promise.all([
    valuesBeside(reading, register, 'state'),
    valuesBeside(reading, register, 'decision'),
    ...[1, 2, 3].map((stage) => idsAt(services, register, stage)),
  ]);
  const isDecided = meantBy(stateOf, (state) => state === 'decided');
  const kinds = counted(DECISION_KINDS, kindOf, byStage.flat().filter(isDecided));
  const stages = byStage.map((ids) => ({
    buildings: ids.length,
    standings: counted(STANDINGS, stateOf, ids),
  }));
  return {
    runId: register.runId,
    buildings: stages.reduce((all, { buildings }) => all + buildings, 0),
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
