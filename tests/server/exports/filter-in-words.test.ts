import { expect, test } from 'vitest';
import { filterInWords } from '../../../server/exports/filter-in-words.ts';

test('an outline is told by its corners', () => {
  const inside: [number, number][] = [[3, 54], [4, 54], [4, 55], [3, 55]]; // prettier-ignore
  expect(filterInWords({ inside })).toBe('Inside an outline of 4 corners on the map');
  expect(filterInWords({ inside, search: 'mill' })).toBe(
    'Words: mill; Inside an outline of 4 corners on the map',
  );
});
