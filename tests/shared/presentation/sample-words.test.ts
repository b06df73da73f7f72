import { describe, expect, it } from 'vitest';
import type { OpenedSamples } from '../../../shared/assessment/opened-samples.ts';
import { certain } from '../../../shared/numerics/range.ts';
import {
  drawnFromWords,
  governingWords,
  seedWords,
  shareWords,
} from '../../../shared/presentation/sample-words.ts';

const GROUND = {
  ...{ number: 2, lossInput: 3, widthInput: 4 },
  volumeLoss: { low: 0.005, central: 0.01, high: 0.015 },
  troughWidth: { low: 0.4, central: 0.5, high: 0.6 },
};

function drawnFrom(overrides: Partial<OpenedSamples>) {
  const usual = { grounds: [GROUND], eOverG: certain(2.6), drawsTroughWidth: true };
  return drawnFromWords({ ...usual, ...overrides }).map(([word, value]) =>
    `${word}: ${value}`.replaceAll('\u00a0', ' '),
  );
}

describe('the words of a sampled run', () => {
  it('say what is drawn from which range', () => {
    expect(drawnFrom({})).toEqual([
      'Ground 2: volume loss 0.5 / 1 / 1.5 %; K 0.4 / 0.5 / 0.6',
      'E/G: 2.6',
    ]);
    expect(drawnFrom({ eOverG: { low: 0.5, central: 2.6, high: 12.5 } })[1]).toBe(
      'E/G: 0.5 to 12.5, evenly',
    );
  });

  it('leave out K where the depth rule has none, and write a certain value once', () => {
    const certainLoss = { ...GROUND, volumeLoss: certain(0.02) };
    expect(drawnFrom({ drawsTroughWidth: false, grounds: [certainLoss] })[0]).toBe(
      'Ground 2: volume loss 2 %',
    );
  });

  it('say how many, from which seed, which wall governs and at which share', () => {
    expect(seedWords({ n: 500, seed: 7 })).toBe('500 samples, seed 7');
    expect(governingWords({ n: 500, governing: { wall: 'b', samples: 431 } })).toBe(
      'Wall b governs in 431 of 500.',
    );
    expect(governingWords({ n: 500, governing: null })).toBeNull();
    expect([0.05, 1].map((share) => shareWords({ share }))).toEqual(['5\u00a0%', 'all']);
  });
});
