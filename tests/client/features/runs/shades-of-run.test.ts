// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { FIRST_SHADE } from '../../../../src/features/map/shades.ts';
import { countsOfShades, shadesOfRun } from '../../../../src/features/runs/shades-of-run.ts';
import { tipOfRun } from '../../../../src/features/runs/tip-of-run.ts';
import { aRunMap } from '../../../support/run-answers.ts';

const { category, stage, settlement } = FIRST_SHADE;

describe('the colours of a run', () => {
  it('follow the category at the end that is asked for, and leave out who has none', () => {
    expect([...shadesOfRun(aRunMap(), 'category', 'low')]).toEqual([
      [2, category],
      [3, category + 1],
      [4, category + 2],
    ]);
    expect(shadesOfRun(aRunMap(), 'category', 'high').get(4)).toBe(category + 4);
  });

  it('follow the stage, or the band of settlement, with numbers of their own', () => {
    expect([...shadesOfRun(aRunMap(), 'stage', 'central')]).toEqual([
      [2, stage + 2],
      [3, stage + 3],
      [4, stage + 3],
    ]);
    expect([...shadesOfRun(aRunMap(), 'settlement', 'central')]).toEqual([
      [2, settlement + 1],
      [3, settlement + 3],
      [4, settlement + 6],
    ]);
  });

  it('are counted', () => {
    const counts = countsOfShades(shadesOfRun(aRunMap(), 'stage', 'central'));
    expect([...counts]).toEqual([
      [stage + 2, 1],
      [stage + 3, 2],
    ]);
  });
});

describe('what is said of a building beside the cursor', () => {
  const tip = tipOfRun(aRunMap());

  it('is its range, its settlement and its stage', () => {
    expect(tip(3)).toEqual(['Category 1 low, 2 central, 2 high', 'Settlement 10.0 mm', 'Stage 3']);
    expect(tip(4)[0]).toBe('Category 2 low, 3 central, 4–5 high');
  });

  it('is that it has no category, or was not there', () => {
    expect(tip(1)).toEqual(['No category', 'Settlement 0.4 mm', 'Let go at stage 1']);
    expect(tip(9)).toEqual(['Not in this run']);
  });
});
