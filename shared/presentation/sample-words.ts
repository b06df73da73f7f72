import type { OpenedSamples, SampledStrain } from '../assessment/opened-samples.ts';
import { SAMPLES } from '../assessment/sampled-run.ts';
import { isRange, type Range } from '../numerics/range.ts';
import { percentFromRatio } from '../units/percent-from-ratio.ts';
import { figure, percent, rangeWords } from './design-words.ts';

/**
 * What a sampled run does.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const SAMPLES_PURPOSE = `Draws volume loss, K and E/G together from their ranges ${SAMPLES} times, works every wall out each time and lets the worst one count. Lengths of drive with the same ranges are one ground and share a draw.`;

/**
 * What a sampled run must not be taken for.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const SAMPLES_CAUTION =
  'The shares show how far the ranges that were put in reach. They are not a probability of damage.';

/**
 * How many samples, and from which seed they can be drawn again.
 *
 * Units: none. Valid: any opened samples. Source: [own].
 */
export function seedWords({ n, seed }: Pick<OpenedSamples, 'n' | 'seed'>): string {
  return `${n} samples, seed ${seed}`;
}

/** A range that stays in one line. */
function ofRange(range: Range, words: (value: number) => string): string {
  const text = isRange(range) ? rangeWords(range, words) : words(range.central);
  return text.replaceAll(' ', '\u00a0');
}

/**
 * The ranges that samples are drawn from, line by line: low, central and high of volume loss and K in each
 * ground, triangular, and those of E/G, where every value between is as likely.
 *
 * Units: volume loss in %. Valid: any opened samples. Source: [own].
 */
export function drawnFromWords({
  grounds,
  eOverG,
  drawsTroughWidth,
}: Pick<OpenedSamples, 'grounds' | 'eOverG' | 'drawsTroughWidth'>): [
  word: string,
  value: string,
][] {
  const plain = (value: number) => figure(value, 3);
  const ofGrounds = grounds.map(({ number, volumeLoss, troughWidth }): [string, string] => {
    const ofLoss = `volume loss ${ofRange(volumeLoss, percent)}\u00a0%`;
    const ofWidth = drawsTroughWidth ? `; K\u00a0${ofRange(troughWidth, plain)}` : '';
    return [`Ground ${number}`, `${ofLoss}${ofWidth}`];
  });
  const { low, high } = eOverG;
  const even = `${plain(low)} to ${plain(high)}, evenly`;
  return [...ofGrounds, ['E/G', isRange(eOverG) ? even : plain(eOverG.central)]];
}

/**
 * How often a wall governs; null where nothing is strained.
 *
 * Units: none. Valid: any opened samples. Source: [own].
 */
export function governingWords({
  governing,
  n,
}: Pick<OpenedSamples, 'governing' | 'n'>): string | null {
  if (governing === null) return null;
  return `Wall ${governing.wall} governs in ${governing.samples} of ${n}.`;
}

/**
 * What share of the samples stays at or under a strain.
 *
 * Units: none. Valid: any sampled strain. Source: [own].
 */
export function shareWords({ share }: Pick<SampledStrain, 'share'>): string {
  return share === 1 ? 'all' : `${percentFromRatio(share).toFixed(0)}\u00a0%`;
}
