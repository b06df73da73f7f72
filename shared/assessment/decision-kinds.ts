import type { DecisionKind } from '../schemas/decisions.ts';
import type { Conclusion } from './conclusion.ts';

function whyNotAtOne({ stage, isWorkedOut }: Conclusion): string | null {
  if (stage === 1) return null;
  if (!isWorkedOut) return 'It could not be worked out.';
  return stage === null
    ? 'Screening lets it go no longer. A new run tells its strain.'
    : 'It reaches a limit of screening, or a rule holds it at stage 1.';
}

function whyNotAtTwo({ stage, heldBy, category, isWorkedOut }: Conclusion): string | null {
  if (stage === 2) return null;
  if (!isWorkedOut) return 'It could not be worked out.';
  if (stage === 1) return 'It can be let go at stage 1.';
  if (stage === null) return 'Its strain is not known. A new run tells it.';
  if (heldBy.length > 0) return `Held because: ${heldBy.join(', ')}.`;
  return `Category ${category ?? 0} leads on.`;
}

/**
 * Why a decision cannot be had of a building by what is concluded of it; null where it can.
 *
 * Units: none. Valid: any conclusion. Source: mair-taylor-burland-1996 for letting go; [own].
 */
export function whyNotDecided(kind: DecisionKind, conclusion: Conclusion): string | null {
  switch (kind) {
    case 'let go at stage 1':
      return whyNotAtOne(conclusion);
    case 'let go at stage 2':
      return whyNotAtTwo(conclusion);
    case 'no measures':
      return conclusion.stage === 1 || conclusion.stage === 2
        ? `It can be let go at stage ${conclusion.stage}.`
        : null;
    case 'go to stage 3':
    case 'adopt a category':
    case 'protective measures':
      return null;
  }
}

/**
 * Whether a decision has to say why: all but letting go, and going on where the figures go on too.
 *
 * Units: none. Valid: any conclusion. Source: [own].
 */
export function needsReason(kind: DecisionKind, { stage }: Pick<Conclusion, 'stage'>): boolean {
  if (kind === 'let go at stage 1' || kind === 'let go at stage 2') return false;
  return kind !== 'go to stage 3' || stage === 1 || stage === 2;
}
