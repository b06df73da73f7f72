import { undertakingSchema, type Undertaking } from '../../shared/schemas/undertakings.ts';
import type { FoundUndertaking } from '../models/undertakings.ts';
import type { SchemeActor } from '../policies/actor.ts';
import { schemePolicy } from '../policies/scheme-policy.ts';

/** What leaves the server of an undertaking; the name of a party only to whoever may read parties. */
export function presentUndertaking(undertaking: FoundUndertaking, actor: SchemeActor): Undertaking {
  const { id, number, promise, madeTo, partyId, source, building, stretch } = undertaking;
  const { due, responsible, doneOn, evidence, isOverdue, version, createdBy } = undertaking;
  const isHidden = partyId !== null && !schemePolicy.readParties(actor);
  return undertakingSchema.parse({
    ...{ id, number, promise, source, building, stretch, due, responsible, doneOn, evidence },
    madeTo: isHidden ? null : madeTo,
    partyId: isHidden ? null : partyId,
    ...{ isOverdue, version, createdBy },
    changedAt: undertaking.changedAt.toISOString(),
  });
}
