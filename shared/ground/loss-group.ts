import type { Range } from '../numerics/range.ts';

/**
 * Lengths of drive whose volume losses keep the same proportions low : central : high. Their field is
 * computed once for `weight` times the trough volume of each and multiplied for any volume loss,
 * since settlement is linear in it.
 *
 * Units: factors without unit. Valid: the central factor is 1 unless the central loss is 0.
 * Source: [own].
 */
export type LossGroup = { readonly factors: Range };

/**
 * The volume loss for which a group's unit field is computed.
 *
 * Units: m/m. Valid: volumeLoss ≥ 0; 0 only where all three values are 0. Source: [own].
 */
export function unitVolumeLoss(volumeLoss: Range): number {
  return volumeLoss.central > 0 ? volumeLoss.central : volumeLoss.high;
}

/**
 * What the unit field of a volume loss is multiplied by at its low, central and high value.
 *
 * Units: none. Valid: volumeLoss ≥ 0. Source: [own].
 */
export function lossFactors(volumeLoss: Range): Range {
  const unit = unitVolumeLoss(volumeLoss);
  if (unit === 0) return { low: 0, central: 0, high: 0 };
  return {
    low: volumeLoss.low / unit,
    central: volumeLoss.central / unit,
    high: volumeLoss.high / unit,
  };
}

/**
 * The index of the group with given factors, which is added where there is none.
 *
 * Units: none. Valid: `groups` grows. Source: [own].
 */
export function groupWithFactors(groups: LossGroup[], factors: Range): number {
  const { low, central, high } = factors;
  const found = groups.findIndex(
    (group) =>
      group.factors.low === low && group.factors.central === central && group.factors.high === high,
  );
  return found >= 0 ? found : groups.push({ factors }) - 1;
}
