import { describe, expect, it } from 'vitest';
import { CLAY_DEPTH_FACTOR, troughWidth } from '../../../shared/ground/trough-width.ts';
import { ruleAt, usesTroughWidthParameter } from '../../../shared/ground/trough-width-rule.ts';
import { certain } from '../../../shared/numerics/range.ts';

/** Ground at 5 m, axis 20 m below it: z0 = 20 m. */
function levels(depth: number) {
  return { ground: 5, founding: 5 - depth, axis: -15 };
}

describe('troughWidth: i by hand', () => {
  // one product, one sum: the last digits only
  const DIGITS = 12;

  it('constant: K·h', () => {
    expect(troughWidth({ kind: 'constant' }, 0.5, levels(0))).toBeCloseTo(10, DIGITS);
    expect(troughWidth({ kind: 'constant' }, 0.3, levels(8))).toBeCloseTo(3.6, DIGITS);
  });

  it('mair-taylor-bracegirdle-1993: K(z) is 0.675 and 1.025 at z/z0 of 0.5 and 0.75, K 0.5', () => {
    expect(troughWidth({ kind: 'clay' }, 0.5, levels(0))).toBeCloseTo(10, DIGITS);
    expect(troughWidth({ kind: 'clay' }, 0.5, levels(10))).toBeCloseTo(0.675 * 10, DIGITS);
    expect(troughWidth({ kind: 'clay' }, 0.5, levels(15))).toBeCloseTo(1.025 * 5, DIGITS);
  });

  it('clay with a small K has no width deep down', () => {
    // 0.2·20 − 0.325·15
    expect(troughWidth({ kind: 'clay' }, 0.2, levels(15))).toBeCloseTo(-0.875, DIGITS);
    expect(CLAY_DEPTH_FACTOR).toBe(0.325);
  });

  it('oreilly-new-1982 in clay: 0.43 z0 + 1.1, less 0.325 z below ground; K is not read', () => {
    for (const K of [0.2, 0.7]) {
      expect(troughWidth({ kind: 'oreilly-new-clay' }, K, levels(0))).toBeCloseTo(9.7, DIGITS);
      expect(troughWidth({ kind: 'oreilly-new-clay' }, K, levels(4))).toBeCloseTo(8.4, DIGITS);
    }
  });

  it('oreilly-new-1982 in granular soil: 0.28 z0 − 0.1, in proportion to h below ground', () => {
    for (const K of [0.2, 0.7]) {
      expect(troughWidth({ kind: 'oreilly-new-sand' }, K, levels(0))).toBeCloseTo(5.5, DIGITS);
      expect(troughWidth({ kind: 'oreilly-new-sand' }, K, levels(5))).toBeCloseTo(4.125, DIGITS);
    }
  });

  it('new-oreilly-1991, layers: the sum of K_j·t_j between founding level and axis', () => {
    const layers = [
      { baseLevel: 2, troughWidth: 0.25 },
      { baseLevel: -5, troughWidth: 0.4 },
      { baseLevel: -40, troughWidth: 0.5 },
    ];
    // 0.25·3 + 0.4·7 + 0.5·10
    expect(troughWidth({ kind: 'layered', layers }, 9, levels(0))).toBeCloseTo(8.55, DIGITS);
    // founded at 0 m, below the first layer: 0.4·5 + 0.5·10
    expect(troughWidth({ kind: 'layered', layers }, 9, levels(5))).toBeCloseTo(7, DIGITS);
    // founded at −10 m, in the last
    expect(troughWidth({ kind: 'layered', layers }, 9, levels(15))).toBeCloseTo(2.5, DIGITS);
  });

  it('one layer is a constant K', () => {
    const layers = [{ baseLevel: -40, troughWidth: 0.45 }];
    const rule = { kind: 'layered', layers } as const;
    expect(troughWidth(rule, 9, levels(6))).toBeCloseTo(0.45 * 14, DIGITS);
  });
});

describe('ruleAt', () => {
  it('takes the K of every layer at one position', () => {
    const layers = [
      { baseLevel: 0, troughWidth: { low: 0.2, central: 0.3, high: 0.5 } },
      { baseLevel: -9, troughWidth: certain(0.45) },
    ];
    const K = ([0, 1, 2, 3, 4] as const).map((position) => {
      const rule = ruleAt({ kind: 'layered', layers }, position);
      return rule.kind === 'layered' ? rule.layers.map((layer) => layer.troughWidth) : [];
    });
    expect(K).toEqual([
      [0.2, 0.45],
      [0.25, 0.45],
      [0.3, 0.45],
      [0.4, 0.45],
      [0.5, 0.45],
    ]);
  });

  it('leaves the other rules alone', () => {
    expect(ruleAt({ kind: 'clay' }, 0)).toEqual({ kind: 'clay' });
  });
});

describe('usesTroughWidthParameter', () => {
  it('is so for K constant and in clay only', () => {
    expect(usesTroughWidthParameter({ kind: 'clay' })).toBe(true);
    expect(usesTroughWidthParameter({ kind: 'constant' })).toBe(true);
    expect(usesTroughWidthParameter({ kind: 'oreilly-new-clay' })).toBe(false);
    expect(usesTroughWidthParameter({ kind: 'oreilly-new-sand' })).toBe(false);
    expect(usesTroughWidthParameter({ kind: 'layered', layers: [] })).toBe(false);
  });
});
