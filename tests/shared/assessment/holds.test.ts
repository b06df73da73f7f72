import { describe, expect, test } from 'vitest';
import { DEFAULT_HOLDS, holdsAt, type HoldFacts } from '../../../shared/assessment/holds.ts';

function names(stage: 1 | 2, facts: HoldFacts): string[] {
  return holdsAt(stage, facts, DEFAULT_HOLDS).map(({ name }) => name);
}

describe('holds', () => {
  test.each<[string, HoldFacts, string]>([
    ['founded deeper than 4 m', { foundingDepth: 4.01 }, 'founded deeper than 4 m'],
    ['piled', { piled: true }, 'piled'],
    ['inside a zone', { insideZoneOfWorks: true }, 'inside the zone of a shaft or box'],
  ])('%s acts at both stages', (_, facts, name) => {
    expect(names(1, facts)).toEqual([name]);
    expect(names(2, facts)).toEqual([name]);
  });

  test.each<[string, HoldFacts, string]>([
    ['listed', { listed: true }, 'listed'],
    ['poor condition', { poorCondition: true }, 'poor condition'],
    ['a total of 3', { sensitivityTotal: 3 }, 'sensitivity brings the total to 3 or more'],
  ])('%s acts at stage 2 only', (_, facts, name) => {
    expect(names(1, facts)).toEqual([]);
    expect(names(2, facts)).toEqual([name]);
  });

  test('what is unknown or short of the limit holds nothing', () => {
    expect(names(2, {})).toEqual([]);
    expect(names(2, { foundingDepth: 4, sensitivityTotal: 2, listed: false })).toEqual([]);
  });

  test('several act together', () => {
    expect(names(2, { piled: true, listed: true })).toEqual(['piled', 'listed']);
  });

  test('holds are data: none given, none act', () => {
    expect(holdsAt(2, { listed: true }, [])).toEqual([]);
  });

  test('each names its source', () => {
    expect(DEFAULT_HOLDS.map(({ source }) => source)).toEqual(
      DEFAULT_HOLDS.map(() => 'common-practice'),
    );
  });
});
