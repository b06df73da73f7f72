import type { Category } from '../damage/categories.ts';
import { millimetreWords, type OwnerFacts } from './owner-words.ts';

const CRACKS: readonly [string, string, string, string, string] = [
  'nothing that you would notice',
  'hairline cracks',
  'cracks that are easy to fill',
  'cracks that a builder has to mend',
  'damage that we must prevent by protecting the building first',
];

function crackWords(category: Category): string {
  return CRACKS[category];
}

function spreadWords({ categoryLow, categoryHigh }: OwnerFacts): string {
  if (categoryLow === null || categoryHigh === null) {
    return 'Each time it comes to nothing that you would notice.';
  }
  if (categoryLow === categoryHigh) {
    return `Each time it comes to the same: ${crackWords(categoryLow)}.`;
  }
  return `With the careful tunnel it comes to ${crackWords(categoryLow)}. With the less careful one it comes to ${crackWords(categoryHigh)}.`;
}

/**
 * How sure a forecast is, in an owner's words: what the range of ground losses comes to.
 *
 * Units: as OwnerFacts. Valid: any result that was worked out. Source: [own].
 */
export function certaintyWords(facts: OwnerFacts): readonly string[] {
  const { settlement, most } = facts;
  const worst = `The most that the ground could sink is ${millimetreWords(most)}.`;
  const expected = settlement === null ? '' : `We expect ${millimetreWords(settlement)}. `;
  return [
    'We worked it out for a careful tunnel and for a less careful one, and for ground that is softer or firmer than we think.',
    `${expected}${worst} ${spreadWords(facts)}`,
  ];
}

/**
 * What an owner has to know of any forecast: the cautions of the method in plain words.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const OWNER_CAUTIONS: readonly string[] = [
  'This is a forecast. It rests on what the ground did over other tunnels.',
  'It does not replace a visit, a survey of your rooms, or what an engineer thinks.',
  'The law and local rules come first, and nothing here takes a right from you.',
  'We will measure the ground as we go, and look again if it moves more than we said.',
];
