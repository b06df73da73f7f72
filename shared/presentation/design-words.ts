import type { AlignmentDesign } from '../schemas/alignments.ts';
import { formatCount } from './format-number.ts';

type Range = AlignmentDesign['volumeLoss'];

/**
 * A figure with so many places at most, and a true minus.
 *
 * Units: those of the value. Valid: finite. Source: [own].
 */
export function figure(value: number, places: number): string {
  return formatCount(Number(value.toFixed(places)));
}

/**
 * A volume loss in %.
 *
 * Units: fraction m/m. Valid: finite. Source: [own].
 */
export function percent(fraction: number): string {
  return figure(fraction * 100, 3);
}

/**
 * Low, central and high of something, each in words of its own.
 *
 * Units: those of the range. Valid: any range. Source: [own].
 */
export function rangeWords(
  { low, central, high }: Range,
  words: (value: number) => string,
): string {
  return `${words(low)} / ${words(central)} / ${words(high)}`;
}

/**
 * One bore, or two and how far apart.
 *
 * Units: spacing m. Valid: a checked design. Source: [own].
 */
export function boresWords({ bores }: Pick<AlignmentDesign, 'bores'>): string {
  return bores.kind === 'single' ? 'one drive' : `two drives, ${figure(bores.spacing, 2)} m apart`;
}

/**
 * What follows the later of two drives.
 *
 * Units: none. Valid: null with one drive. Source: [own].
 */
export function laterWords({ bores }: Pick<AlignmentDesign, 'bores'>): string | null {
  return bores.kind === 'single'
    ? null
    : `${bores.later === 'left' ? 'Left' : 'Right'} drive later × ${figure(bores.laterFactor, 3)}`;
}

/**
 * What settlement is worked out from, in the words of the line under the bar.
 *
 * Units: as AlignmentDesign. Valid: a checked design. Source: [own].
 */
export function designParts(design: AlignmentDesign): string[] {
  const { diameter, volumeLoss, troughWidth, intervals } = design;
  const own = intervals.length > 0 ? ', intervals apart' : '';
  return [
    `D ${figure(diameter, 2)} m, ${boresWords(design)}`,
    `Volume loss ${rangeWords(volumeLoss, percent)} %, K ${rangeWords(troughWidth, (k) => figure(k, 3))}${own}`,
    ...[laterWords(design)].filter((words) => words !== null),
  ];
}
