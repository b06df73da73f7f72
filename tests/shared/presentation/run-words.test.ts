// @vitest-environment node
import { describe, expect, it } from 'vitest';
import {
  countsWords,
  percentDone,
  staleWords,
  stoppedWords,
  timeLeftWords,
} from '../../../shared/presentation/run-words.ts';
import { reserveWords, stageWords } from '../../../shared/presentation/result-words.ts';
import { aRunAnswer, aRunDetail } from '../../support/run-answers.ts';
import { slopeWords } from '../../../shared/presentation/slope-words.ts';

describe('a run in words', () => {
  it('tells where it stopped, why, and what still stands', () => {
    const stopped = aRunAnswer({ number: 42, state: 'cancelled', done: 123 });
    expect(stoppedWords(stopped, aRunAnswer({ number: 41 }))).toBe(
      'Run 42 stopped at 61 %. Run 41 still stands.',
    );
    expect(stoppedWords({ ...stopped, fault: 'No room on the disk.' }, undefined)).toBe(
      'Run 42 stopped at 61 %: No room on the disk.',
    );
    expect(percentDone({ done: 0, buildings: 0 })).toBe(0);
  });

  it('tells what has changed since', () => {
    const { since } = aRunAnswer();
    expect(staleWords({ number: 41 }, since)).toBeNull();
    expect(staleWords({ number: 41 }, { ...since, register: true })).toBe(
      'Worked out on run 41. The register has changed since.',
    );
    expect(staleWords({ number: 41 }, { register: true, option: true, rules: true })).toBe(
      'Worked out on run 41. The register, option and rules have changed since.',
    );
  });

  it('counts buildings by category', () => {
    const { counts } = aRunDetail();
    if (counts === null) throw new Error('The run has no counts.');
    expect(countsWords({ ...counts, faults: 1 })).toBe(
      '2 in category 0, 2 in category 1, 1 in category 2, 195 let go at stage 1, 1 not worked out',
    );
  });

  it.each([
    [3, 'a few seconds left'],
    [23, 'about 25 s left'],
    [61, 'about 2 min left'],
  ])('says of %d s: %s', (seconds, words) => {
    expect(timeLeftWords(seconds)).toBe(words);
  });
});

describe('what a run found in words', () => {
  it('is the breakpoint with its reserve, or that there is none', () => {
    const found = { breakpointVolumeLoss: 0.0241, reserve: 0.607, reserveOverHigh: -0.1 };
    expect(reserveWords(found)).toBe(
      'Breaks at a volume loss of 2.41\u00a0%. Reserve 0.61 over the central value, −0.1 over the high.',
    );
    const none = { breakpointVolumeLoss: null, reserve: null, reserveOverHigh: null };
    expect(reserveWords(none)).toBe('Holds up to a volume loss of 10\u00a0%.');
  });

  it('is a slope, and how far the building came', () => {
    expect([slopeWords(1 / 780), slopeWords(0)]).toEqual(['1 in 780', 'none']);
    expect([slopeWords(-1e-6), slopeWords(9e-7)]).toEqual(['1 in 1000000', 'none']);
    expect(stageWords({ stage: 2, heldBy: [] })).toBe('Let go at stage 2');
    expect(stageWords({ stage: 3, heldBy: ['listed'] })).toBe('Stage 3, held by listed');
  });
});
