import { expect, test } from 'vitest';
import { standingWords } from '../../../shared/presentation/decision-words.ts';

test('what is decided says where it stands unless it is in force', () => {
  expect(standingWords(null)).toBe('To decide');
  const adopted = { kind: 'adopt a category', category: 4 } as const;
  expect(standingWords({ ...adopted, state: 'decided' })).toBe('Category 4–5 adopted');
  expect(standingWords({ ...adopted, state: 'returned' })).toBe('Category 4–5 adopted, returned');
  const measures = { kind: 'no measures', category: null, state: 'to look at again' } as const;
  expect(standingWords(measures)).toBe('No measures, to look at again');
});
