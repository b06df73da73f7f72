import { expect, test } from 'vitest';
import type { Category } from '../../../shared/damage/categories.ts';
import {
  faultsOfMarks,
  letterSubject,
  letterText,
  type LetterTextPart,
  type LetterValues,
} from '../../../shared/presentation/letter-text.ts';
import { DEFAULT_TEMPLATES } from '../../../shared/presentation/letter-templates.ts';
import { certaintyWords, OWNER_CAUTIONS } from '../../../shared/presentation/owner-certainty.ts';
import { ownerDecisionWords } from '../../../shared/presentation/owner-decision.ts';
import {
  movementWords,
  ownerLooks,
  staysUsable,
  type OwnerFacts,
} from '../../../shared/presentation/owner-words.ts';
import { DECISION_KINDS } from '../../../shared/schemas/decisions.ts';
import { defaultLetterSettings, LETTER_KINDS } from '../../../shared/schemas/letter-settings.ts';
import { readingEase } from '../../support/reading-ease.ts';

const CATEGORIES: readonly Category[] = [0, 1, 2, 3, 4];

/** By Flesch's scale plain English; no template may read harder. */
const PLAIN = 60;

function valuesAt(category: Category): LetterValues {
  const facts: OwnerFacts = {
    ...{ settlement: 0.0442, most: 0.061, categoryLow: category, category, categoryHigh: category },
    ...{ tunnels: 2, depth: 19.6, distance: 0 },
  };
  return {
    ...{ name: 'Ada Hopper', scheme: 'Port Dogger crossing', place: 'your home' },
    movement: movementWords(facts),
    looks: ownerLooks(category),
    stays: staysUsable(category, 'home'),
    repairs: defaultLetterSettings('2026-12-01').repairs.words,
    sure: certaintyWords(facts).join(' '),
    'answer by': 'Friday 11 December',
    contact: 'the owners’ line',
    decision: ownerDecisionWords(DECISION_KINDS[category]),
    buildings: ['9 Fishgate'],
    measures: ['We prop the wall.'],
    dates: ['November 2027: The first tunnel passes.'],
    cautions: OWNER_CAUTIONS,
    link: 'Open your page',
  };
}

function asWords(part: LetterTextPart): string {
  if (typeof part === 'string') return part;
  return 'list' in part ? part.list.join(' ') : `${part.link}.`;
}

test.each(LETTER_KINDS)(
  'the letter “%s” has good marks and reads easily at any category',
  (kind) => {
    const { subject, body } = DEFAULT_TEMPLATES[kind];
    expect([...faultsOfMarks(subject), ...faultsOfMarks(body)]).toEqual([]);
    const eases = CATEGORIES.map((category) => {
      const text = letterText(body, valuesAt(category)).map(asWords).join(' ');
      return readingEase(text);
    });
    const found = eases.map((ease) => ease.toFixed(0)).join(', ');
    process.stdout.write(`Flesch ${found}: the letter “${kind}”\n`);
    for (const ease of eases) expect(ease).toBeGreaterThanOrEqual(PLAIN);
  },
);

test('the cautions stand in every letter, and whom to ask', () => {
  for (const kind of LETTER_KINDS) {
    const parts = letterText(DEFAULT_TEMPLATES[kind].body, valuesAt(1));
    expect(parts).toContainEqual({ list: OWNER_CAUTIONS });
    expect(parts.map(asWords).join(' ')).toContain('please ask us: the owners’ line');
  }
});

test('what a value holds is never taken for a mark', () => {
  const values = { ...valuesAt(1), name: '{cautions} {link} {name}' };
  expect(letterText('Dear {name},', values)).toEqual(['Dear {cautions} {link} {name},']);
  expect(letterText('{name}', values)).toEqual(['{cautions} {link} {name}']);
  expect(letterSubject('About {place}, {name}', values)).toBe(
    'About your home, {cautions} {link} {name}',
  );
});

test('empty lines part paragraphs, dashes make lists, and what is empty leaves nothing', () => {
  const values = { ...valuesAt(1), measures: [], looks: '' };
  const body = 'One\nline.\n\n\n- a\n- b {place}\n\n{measures}\n\n{looks}\n\n{link}';
  const link: Exclude<LetterTextPart, string> = { link: 'Open your page' };
  expect(letterText(body, values)).toEqual(['One line.', { list: ['a', 'b your home'] }, link]);
});

test('marks that are not known, stand where they may not or are not closed are told by line', () => {
  expect(faultsOfMarks('Dear {nmae},\nsee {cautions} here\n{name\n{link}')).toEqual([
    'Line 1: there is no mark {nmae}.',
    'Line 2: {cautions} stands alone in its line.',
    'Line 3: a brace is not closed.',
  ]);
});
