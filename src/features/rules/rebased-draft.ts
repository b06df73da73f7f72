import type { RulesDraft } from './rules-draft.ts';

function isSame(a: unknown, b: unknown): boolean {
  return JSON.stringify(a) === JSON.stringify(b);
}

/** A draft begun from one version, laid on another: each rule that was written on stays as written. */
export function rebasedDraft(mine: RulesDraft, from: RulesDraft, onto: RulesDraft): RulesDraft {
  function kept<K extends keyof RulesDraft>(rule: K): RulesDraft[K] {
    return isSame(mine[rule], from[rule]) ? onto[rule] : mine[rule];
  }
  return {
    screening: kept('screening'),
    holds: kept('holds'),
    depth: kept('depth'),
    focus: kept('focus'),
    cutOff: kept('cutOff'),
    horizontalStrain: kept('horizontalStrain'),
    compression: kept('compression'),
    leadingCategory: kept('leadingCategory'),
    sensitivity: kept('sensitivity'),
  };
}
