import { describe, expect, test } from 'vitest';
import { everydayLength } from '../../../shared/presentation/everyday-length.ts';
import { certaintyWords, OWNER_CAUTIONS } from '../../../shared/presentation/owner-certainty.ts';
import {
  crackCaption,
  ownerHeadline,
  ownerParagraph,
  ownerPlace,
  staysUsable,
  type OwnerFacts,
} from '../../../shared/presentation/owner-words.ts';
import { defaultLetterSettings } from '../../../shared/schemas/letter-settings.ts';
import type { Category } from '../../../shared/damage/categories.ts';
import { readingEase } from '../../support/reading-ease.ts';

const CATEGORIES: readonly Category[] = [0, 1, 2, 3, 4];

function facts(overrides: Partial<OwnerFacts> = {}): OwnerFacts {
  return {
    ...{ settlement: 0.0442, most: 0.061, categoryLow: 1, category: 1, categoryHigh: 1 },
    ...{ tunnels: 2, depth: 19.6, distance: 0 },
    ...overrides,
  };
}

/** Everything that an owner reads of a forecast. */
function allWords(of: OwnerFacts, place: 'home' | 'building'): string[] {
  return [
    `${ownerHeadline(of, place)}.`,
    ownerParagraph(of, place),
    `${crackCaption(of.category) ?? 'Nothing'}.`,
    staysUsable(of.category, place),
    defaultLetterSettings('2026-12-01').repairs.words,
    ...certaintyWords(of),
    ...OWNER_CAUTIONS,
  ];
}

test('a home above two tunnels is told of in one sentence and one paragraph', () => {
  expect(ownerHeadline(facts(), 'home')).toBe(
    'Your home is expected to stay sound, with hairline cracks at most',
  );
  expect(ownerParagraph(facts(), 'home')).toBe(
    'Two tunnels will pass under or beside your home, about 20 metres down. The ground will sink by about 44 millimetres, slowly, over a few weeks. That is about as long as a match. You may see hairline cracks in plaster. They can be filled when you next decorate.',
  );
});

test('where worse may come, the sentence does not say at most, and the bracket is told in words', () => {
  const worse = facts({ categoryLow: 0, categoryHigh: 2 });
  expect(ownerHeadline(worse, 'building')).toBe(
    'Your building is expected to stay sound, with hairline cracks',
  );
  expect(certaintyWords(worse).join(' ')).toContain(
    'The most that the ground could sink is about 61 millimetres.',
  );
  expect(certaintyWords(worse).join(' ')).toContain(
    'With the careful tunnel it comes to nothing that you would notice. With the less careful one it comes to cracks that are easy to fill.',
  );
});

test('where screening let it go, the most is told and nothing else is made up', () => {
  const screened = { settlement: null, categoryLow: null, category: null, categoryHigh: null };
  const far = facts({ ...screened, most: 0.004, distance: 43, tunnels: 1 });
  expect(ownerHeadline(far, 'home')).toBe('Your home is expected to stay as it is');
  expect(ownerParagraph(far, 'home')).toBe(
    'A tunnel will pass about 45 metres from your home, about 20 metres down. The ground will sink by about 4 millimetres at most, slowly, over a few weeks. That is about as thick as two coins. You are not likely to notice anything.',
  );
  expect(ownerParagraph({ ...far, most: 0.0004 }, 'home')).toContain(
    'The ground will sink by less than 1 millimetre.',
  );
  expect(crackCaption(null)).toBeNull();
});

test.each([
  ['town house', 'home'],
  ['flats', 'home'],
  ['warehouse', 'building'],
  ['public house', 'building'],
  ['dwelling', 'home'],
  ['House', 'home'],
  ['shop', 'building'],
  [null, 'building'],
])('%s is called a %s', (use, place) => {
  expect(ownerPlace(use)).toBe(place);
});

test.each([
  [0.4, 'bank card'],
  [2, 'coin'],
  [7, 'pencil'],
  [18, 'finger'],
  [44, 'match'],
  [85, 'hand'],
  [500, 'more than'],
])('%s mm is held beside a %s', (millimetres, thing) => {
  expect(everydayLength(millimetres)).toContain(thing);
});

describe.each(CATEGORIES)('what is read where the category is %i', (category) => {
  const spreads = [facts({ category, categoryLow: category, categoryHigh: category })];
  if (category < 4) spreads.push(facts({ category, categoryLow: 0, categoryHigh: 4 }));

  test.each(['home', 'building'] as const)('of a %s is plain English', (place) => {
    for (const of of spreads) {
      const words = allWords(of, place);
      const ease = readingEase(words.join(' '));
      process.stdout.write(`Flesch ${ease.toFixed(0)}: ${place}, category ${category}\n`);
      expect(ease).toBeGreaterThanOrEqual(60);
    }
  });

  test('promises no money, which is for whoever builds the tunnel to promise', () => {
    const words = allWords(facts({ category, categoryHigh: category }), 'home').join(' ');
    expect(words).not.toMatch(/\bwe pay|\bpay for|free of charge|costs? you|put right/i);
  });

  test('no number of a category and no word of the trade', () => {
    const words = allWords(facts({ category, categoryHigh: 4 }), 'home').join(' ');
    expect(words).not.toMatch(/categor|settle|strain|volume|trough|tensile|deflection|burland/i);
  });
});

describe('readingEase', () => {
  test('is high for plain words and low for long ones', () => {
    expect(readingEase('The cat sat on the mat.')).toBeCloseTo(116.1, 1);
    expect(
      readingEase('Differential settlement necessitates considerable precautionary investigation.'),
    ).toBeLessThan(0);
    expect(readingEase('')).toBe(100);
  });
});
