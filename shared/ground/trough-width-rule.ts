import { atPosition, type Range } from '../numerics/range.ts';

/**
 * A layer of the ground, from the base of the one above it down to its own base level.
 *
 * Units: baseLevel m above datum, troughWidth K without unit. Valid: given from the top down; the
 * last one reaches below every axis. Source: new-oreilly-1991.
 */
export type Layer<K = Range> = { readonly baseLevel: number; readonly troughWidth: K };

/**
 * How the trough width follows from the depths: K constant, K growing with depth in clay, two fitted
 * lines that are no K, or K by layers.
 *
 * Units: none. Valid: 'oreilly-new-clay' for axes 3 to 34 m deep, 'oreilly-new-sand' for 6 to 10 m;
 * 'clay' for K ≥ 0.4. Source: mair-taylor-bracegirdle-1993, oreilly-new-1982, new-oreilly-1991.
 */
export type TroughWidthRule<K = Range> =
  | { readonly kind: 'constant' | 'clay' | 'oreilly-new-clay' | 'oreilly-new-sand' }
  | { readonly kind: 'layered'; readonly layers: readonly Layer<K>[] };

/**
 * A rule with the K of every layer at one position of its range.
 *
 * Units: none. Valid: any rule; position 0 to 4. Source: [own].
 */
export function ruleAt(rule: TroughWidthRule, position: number): TroughWidthRule<number> {
  if (rule.kind !== 'layered') return rule;
  const layers = rule.layers.map((layer) => ({
    baseLevel: layer.baseLevel,
    troughWidth: atPosition(layer.troughWidth, position),
  }));
  return { kind: 'layered', layers };
}

/**
 * Whether the K of the drives is an input under a rule. Where it is not, the bracket has volume
 * loss only.
 *
 * Units: none. Valid: any rule. Source: [own].
 */
export function usesTroughWidthParameter(rule: TroughWidthRule): boolean {
  return rule.kind === 'constant' || rule.kind === 'clay';
}
