import type { Metres, Ratio } from '../units/quantity.ts';

/**
 * V_s, the volume of the settlement trough per metre of drive: V_L of the excavated face.
 *
 * Units: m/m and m → m³/m. Valid: volumeLoss ≥ 0 as a fraction, not %; diameter is the excavated
 * one, > 0. Source: attewell-woodman-1982; the relation is the definition of volume loss.
 */
export function volumePerMetre(volumeLoss: Ratio, diameter: Metres): number {
  return (Number(volumeLoss) * Math.PI * Number(diameter) * Number(diameter)) / 4;
}
