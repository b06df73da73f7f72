import { describe, expect, it } from 'vitest';
import { troughWidthWarning } from '../../../shared/ground/trough-width-warning.ts';
import { depthToFocus, focusWarning } from '../../../shared/ground/vector-focus.ts';

function levels(axisDepth: number, depth = 0) {
  return { ground: 0, founding: -depth, axis: -axisDepth };
}

const OUTSIDE = 'trough width rule outside its depths';
const BELOW = 'depth rule for clay with K below 0.4';

describe('troughWidthWarning', () => {
  it('below ground in clay K is to be 0.4 and more', () => {
    expect(troughWidthWarning({ kind: 'clay' }, 0.399, levels(20, 1))).toBe(BELOW);
    expect(troughWidthWarning({ kind: 'clay' }, 0.4, levels(20, 1))).toBeUndefined();
    expect(troughWidthWarning({ kind: 'clay' }, 0.3, levels(20))).toBeUndefined();
  });

  it.each([
    [2.99, OUTSIDE],
    [3, undefined],
    [34, undefined],
    [34.01, OUTSIDE],
  ])("oreilly-new-1982's line for clay at an axis depth of %d m: %s", (axisDepth, wanted) => {
    expect(troughWidthWarning({ kind: 'oreilly-new-clay' }, 0.5, levels(axisDepth))).toBe(wanted);
  });

  it.each([
    [5.99, OUTSIDE],
    [6, undefined],
    [10, undefined],
    [10.01, OUTSIDE],
  ])("oreilly-new-1982's line for sand at an axis depth of %d m: %s", (axisDepth, wanted) => {
    expect(troughWidthWarning({ kind: 'oreilly-new-sand' }, 0.5, levels(axisDepth))).toBe(wanted);
  });

  it('has nothing to say of a constant K and of layers', () => {
    expect(troughWidthWarning({ kind: 'constant' }, 0.2, levels(50, 9))).toBeUndefined();
    expect(troughWidthWarning({ kind: 'layered', layers: [] }, 0.2, levels(5))).toBeUndefined();
  });
});

describe('depthToFocus', () => {
  it('oreilly-new-1982: the axis', () => {
    expect(depthToFocus('axis', levels(20, 3))).toBe(17);
  });

  it('taylor-1995: 0.175/0.325 of the axis depth below the axis', () => {
    // 20·1.538462 − 3
    expect(depthToFocus('deep', levels(20, 3))).toBeCloseTo(27.76923, 5);
  });

  it('taylor-1995: at ground level strain is cut by 35 %', () => {
    // i²/f against i²/z0: 0.325/0.5
    const share = depthToFocus('axis', levels(20)) / depthToFocus('deep', levels(20));
    expect(share).toBeCloseTo(0.65, 12);
  });
});

describe('focusWarning', () => {
  const warning = 'deep focus outside its range';

  it.each([
    [0.399, warning],
    [0.4, undefined],
    [0.6, undefined],
    [0.601, warning],
  ])('the deep focus with the clay rule and K %d: %s', (K, wanted) => {
    expect(focusWarning('deep', { kind: 'clay' }, K)).toBe(wanted);
  });

  it('the deep focus with another rule', () => {
    expect(focusWarning('deep', { kind: 'constant' }, 0.5)).toBe(warning);
    expect(focusWarning('deep', { kind: 'oreilly-new-clay' }, 0.5)).toBe(warning);
  });

  it('nothing of the axis', () => {
    expect(focusWarning('axis', { kind: 'constant' }, 0.2)).toBeUndefined();
  });
});
