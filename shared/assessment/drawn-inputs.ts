import { unitVolumeLoss } from '../ground/loss-group.ts';
import { at } from '../numerics/at.ts';
import { latinHypercube } from '../numerics/latin-hypercube.ts';
import { randomShares } from '../numerics/random-numbers.ts';
import { isRange, positionOf, type Range } from '../numerics/range.ts';
import { triangularQuantile } from '../numerics/triangular-quantile.ts';
import type { Recorder } from '../working.ts';
import type { SampledGround } from './sampled-grounds.ts';

/**
 * What one sample takes of a ground: volume loss and K, with the factor on the unit fields and the
 * position in the range of K that they come to.
 *
 * Units: volumeLoss m/m, the others none. Valid: made by `drawnGround`. Source: [own].
 */
export type DrawnGround = {
  readonly volumeLoss: number;
  readonly troughWidth: number;
  readonly factor: number;
  readonly position: number;
};

/**
 * One sample of all inputs: each ground in order, and what share of the range of E/G lies below its own.
 *
 * Units: none. Valid: made by `drawnInputs`. Source: [own].
 */
export type DrawnInputs = { readonly eOverG: number; readonly grounds: readonly DrawnGround[] };

/**
 * What a ground comes to at given shares of its distributions.
 *
 * Units: as DrawnGround. Valid: shares 0 to 1. Source: [common] for the triangular distributions.
 */
export function drawnGround(
  { number, volumeLoss: losses, troughWidth: widths }: SampledGround,
  shares: { readonly volumeLoss: number; readonly troughWidth: number },
  record?: Recorder,
): DrawnGround {
  const ofLoss = { symbol: 'V_L', meaning: `volume loss drawn for ground ${number}`, unit: 'm/m' };
  const ofWidth = { symbol: 'K', meaning: `K drawn for ground ${number}`, unit: '' };
  const volumeLoss = triangularQuantile(losses, shares.volumeLoss, ofLoss, record);
  const troughWidth = triangularQuantile(widths, shares.troughWidth, ofWidth, record);
  const unit = unitVolumeLoss(losses);
  const factor = unit === 0 ? 0 : volumeLoss / unit;
  record?.({
    symbol: 'r',
    meaning: `factor on the unit fields of ground ${number}`,
    expression: unit === 0 ? '0' : 'V_L / V_u',
    inputs: unit === 0 ? {} : { V_L: volumeLoss, V_u: unit },
    value: factor,
    unit: '',
    reference: 'own',
  });
  return {
    volumeLoss,
    troughWidth,
    factor,
    position: positionOf(widths, troughWidth),
  };
}

/**
 * An E/G drawn from its range, every value being as likely.
 *
 * Units: none. Valid: share 0 to 1. Source: [common] for the uniform distribution.
 */
export function drawnEOverG(range: Range, share: number, record?: Recorder): number {
  if (!isRange(range)) return range.central;
  const { low, high } = range;
  const value = low + share * (high - low);
  record?.({
    symbol: 'EG',
    meaning: 'E/G drawn for this building',
    expression: 'low + q * (high - low)',
    inputs: { q: share, low, high },
    value,
    unit: '',
    reference: 'common-practice',
  });
  return value;
}

/**
 * The shares of each input's distribution that each sample takes: `shares[d][k]` for input d of sample k,
 * input 0 being E/G.
 *
 * Units: none. Valid: seed as `randomShares`. Source: mckay-beckman-conover-1979.
 */
export function drawnShares(
  grounds: readonly SampledGround[],
  n: number,
  seed: number,
): Float64Array[] {
  return latinHypercube(n, 1 + 2 * grounds.length, randomShares(seed));
}

/**
 * The samples of a run: each of n draws of all inputs.
 *
 * Units: as DrawnInputs. Valid: `shares` of the same grounds. Source: mckay-beckman-conover-1979.
 */
export function drawnInputs(
  grounds: readonly SampledGround[],
  shares: readonly Float64Array[],
): DrawnInputs[] {
  const [ofEOverG = new Float64Array()] = shares;
  return Array.from(ofEOverG, (eOverG, k) => ({
    eOverG,
    grounds: grounds.map((ground) =>
      drawnGround(ground, {
        volumeLoss: at(shares[ground.lossInput] ?? ofEOverG, k),
        troughWidth: at(shares[ground.widthInput] ?? ofEOverG, k),
      }),
    ),
  }));
}
