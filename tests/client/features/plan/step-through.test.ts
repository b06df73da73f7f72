// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { stepThrough } from '../../../../src/features/plan/step-through.ts';

const IDS = [3, 5, 9];

describe('stepThrough', () => {
  it('goes on and back', () => {
    expect(stepThrough(IDS, 3, 1)).toBe(5);
    expect(stepThrough(IDS, 9, -1)).toBe(5);
  });

  it('stays at either end', () => {
    expect(stepThrough(IDS, 9, 1)).toBe(9);
    expect(stepThrough(IDS, 3, -1)).toBe(3);
  });

  it('starts at an end where none of them is selected', () => {
    expect(stepThrough(IDS, null, 1)).toBe(3);
    expect(stepThrough(IDS, 77, -1)).toBe(9);
  });

  it('goes nowhere among none', () => {
    expect(stepThrough([], 3, 1)).toBeNull();
  });
});
