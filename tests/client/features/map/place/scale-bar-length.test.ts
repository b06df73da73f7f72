// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { roundStep } from '../../../../../src/features/map/place/round-step.ts';
import { scaleBarLength } from '../../../../../src/features/map/place/scale-bar-length.ts';

describe('roundStep', () => {
  it.each([
    [1, 1],
    [1.99, 1],
    [2, 2],
    [4.99, 2],
    [5, 5],
    [99, 50],
    [0.3, 0.2],
  ])('of at most %d is %d', (most, step) => {
    expect(roundStep(most)).toBeCloseTo(step, 12);
  });
});

describe('scaleBarLength', () => {
  it('is as long on the map as it says', () => {
    const { metres, pixels } = scaleBarLength(0.56, 190);
    expect(metres).toBe(100);
    expect(pixels * 0.56).toBeCloseTo(100, 9);
    expect(pixels).toBeLessThanOrEqual(190);
  });

  it.each([
    [0.56, ['0', '50', '100 m']],
    [0.03, ['0', '2.5', '5 m']],
    [6, ['0', '500', '1\u2009000 m']],
    [30, ['0', '2.5', '5 km']],
  ])('at %d metres a pixel reads %j', (scale, figures) => {
    expect(scaleBarLength(scale, 190).figures).toEqual(figures);
  });
});
