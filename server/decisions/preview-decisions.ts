import type { z } from 'zod';
import { isListed } from '../../shared/assessment/prepared-building.ts';
import type { DecisionPreview, proposedDecisionSchema } from '../../shared/schemas/decisions.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Services } from '../services.ts';
import { meantForDecision } from './meant-for-decision.ts';
import { shownRunOf } from './shown-run-of.ts';

type Counted = { -readonly [K in keyof DecisionPreview]: DecisionPreview[K] };

function most(a: number | null, b: number): number {
  return a === null ? b : Math.max(a, b);
}

/** What a decision of the buildings that are meant would come to. */
export async function previewDecisions(
  { database }: Pick<Services, 'database'>,
  scheme: Scheme,
  proposed: z.infer<typeof proposedDecisionSchema>,
): Promise<DecisionPreview> {
  const run = await shownRunOf(database, scheme.id, proposed.runId, null);
  const refused = new Map<string, number>();
  const preview: Counted = {
    ...{ meant: 0, allowed: 0, refused: [], settlement: null, slope: null },
    ...{ categories: [0, 0, 0, 0, 0], sensitive: 0, assumed: 0, listed: 0 },
  };
  for await (const some of meantForDecision(database, run, proposed, null)) {
    for (const one of some) {
      preview.meant += 1;
      if (one.why !== null) {
        refused.set(one.why, (refused.get(one.why) ?? 0) + 1);
        continue;
      }
      const { basis, building } = one;
      preview.allowed += 1;
      preview.settlement = most(preview.settlement, basis.settlement);
      preview.slope = most(preview.slope, basis.slope);
      if (basis.category !== null) preview.categories[basis.category] += 1;
      if (basis.isSettled === false) preview.sensitive += 1;
      if (basis.assumed.length > 0) preview.assumed += 1;
      if (isListed(building.facts) === true) preview.listed += 1;
    }
  }
  const reasons = [...refused].sort(([, a], [, b]) => b - a);
  return { ...preview, refused: reasons.map(([why, count]) => ({ why, count })) };
}
