import { funnelSchema, type Funnel } from '../../shared/schemas/decision-answers.ts';
import { countAssigned, countFunnel } from '../models/count-funnel.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { registerOf } from '../register/register-of.ts';
import type { Services } from '../services.ts';

const withoutMine = funnelSchema.omit({ mine: true });

/**
 * How many buildings of the run that is shown stand where. Kept as long as tiles are, by the versions that
 * it hangs on.
 */
export async function funnelOf(
  services: Pick<Services, 'database' | 'tiles'>,
  { id: personId }: Actor,
  scheme: Scheme,
): Promise<Funnel> {
  const { database, tiles } = services;
  const register = await registerOf(services, scheme);
  const { version, runId, decisionsVersion } = register;
  const key = `funnel/${scheme.id}/${version}/${runId}/${decisionsVersion}`;
  const kept = await tiles.get(key, async () =>
    Buffer.from(JSON.stringify(await countFunnel(database, register))),
  );
  const mine = await countAssigned(database, scheme.id, personId);
  return { ...withoutMine.parse(JSON.parse(kept.toString())), mine };
}
