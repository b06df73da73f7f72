import { categoryOfStrain } from '../damage/category-of-strain.ts';
import type { Bracket } from './bracket.ts';

/**
 * The inputs that a bracket varies.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export type BracketInput = 'volumeLoss' | 'troughWidth' | 'eOverG';

/**
 * The same in words.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const BRACKET_INPUTS: Readonly<Record<BracketInput, string>> = {
  volumeLoss: 'volume loss',
  troughWidth: 'K',
  eOverG: 'E/G',
};

/**
 * Whether a category holds over the whole bracket and, where it does not, the input that moves it most.
 *
 * Units: none. Valid: `input` is null when settled. Source: [own].
 */
export type Sensitivity = { readonly settled: boolean; readonly input: BracketInput | null };

/** The spread of category, and of strain among equals, when one input alone varies. */
function spread(strains: readonly number[]): { categories: number; strain: number } {
  const [low, high] = [Math.min(...strains), Math.max(...strains)];
  return { categories: categoryOfStrain(high) - categoryOfStrain(low), strain: high - low };
}

/**
 * Settled or sensitive, and to what: each input is varied alone about the central values of the
 * others; the largest change of category counts, and among equals the largest change of strain. It is
 * settled only where the samples of a sampled run, if there is one, are of the same category too.
 *
 * Units: strains of the samples m/m. Valid: any bracket; central stands in the middle of each list.
 * Source: [own].
 */
export function sensitivityOf(bracket: Bracket, sampled: readonly number[] = []): Sensitivity {
  const all = [...bracket.strains.flat(2), ...sampled];
  if (spread(all).categories === 0) return { settled: true, input: null };
  const centre = bracket.strains[bracket.strains.length >> 1] ?? [];
  const alone: [BracketInput, number[]][] = [
    ['volumeLoss', centre.map((row) => row[2] ?? 0)],
    ['troughWidth', [...(centre[1] ?? [])]],
    ['eOverG', bracket.strains.map((levels) => levels[1]?.[2] ?? 0)],
  ];
  let input: BracketInput = 'volumeLoss';
  let largest = { categories: -1, strain: -1 };
  for (const [name, strains] of alone) {
    const found = spread(strains);
    const more =
      found.categories > largest.categories ||
      (found.categories === largest.categories && found.strain > largest.strain);
    if (more) [input, largest] = [name, found];
  }
  return { settled: false, input };
}
