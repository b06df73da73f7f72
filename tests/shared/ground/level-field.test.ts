import { describe, expect, it } from 'vitest';
import { fieldAtPoints } from '../../../shared/ground/field-at-points.ts';
import { FIELD, FIELD_SIZE, PACK_STRIDE } from '../../../shared/ground/kernel.ts';
import { levelField, type GroundState } from '../../../shared/ground/level-field.ts';
import { placeOf } from '../../../shared/ground/place.ts';
import { siteOf } from '../../../shared/ground/site.ts';
import { certain } from '../../../shared/numerics/range.ts';
import { aDrive, aModel } from '../../support/builders.ts';

const COMPLETE: GroundState = { position: 2, faces: [] };

function fieldOf(model: ReturnType<typeof aModel>, state = COMPLETE, founding = 0) {
  const place = placeOf([{ start: [0, 0], end: [0, 30] }], 0, founding);
  return levelField(model, siteOf(model, place), state);
}

describe('levelField', () => {
  it('packs start, direction, 1/i, L/i, V_s/i and i²/f', () => {
    const { packs, smallestWidth } = fieldOf(aModel());
    const [pack] = packs;
    expect(pack?.count).toBe(1);
    const numbers = [...(pack?.pack ?? [])].slice(0, PACK_STRIDE);
    const wanted = [-500, 0, 1, 0, 0.1, 100, 0.0424115, 5];
    // V_s is 0.424115 m³/m, written to six digits
    for (const [k, number] of numbers.entries()) expect(number).toBeCloseTo(wanted[k] ?? NaN, 7);
    expect(smallestWidth).toBe(10);
  });

  it('clips the last piece at the face and packs nothing of a drive not begun', () => {
    const { packs } = fieldOf(aModel(), { position: 2, faces: [300] });
    expect(packs[0]?.pack[5]).toBeCloseTo(30, 12);
    const none = fieldOf(aModel(), { position: 2, faces: [0] });
    expect(none.packs[0]?.count).toBe(0);
    expect(none.smallestWidth).toBe(Infinity);
  });

  it('packs one drive alone where that is wanted', () => {
    const model = aModel([
      aDrive(),
      aDrive({ volumeLoss: { low: 0.01, central: 0.02, high: 0.04 } }),
    ]);
    const counts = [0, 1].map((drive) =>
      fieldOf(model, { ...COMPLETE, only: (piece) => piece.drive === drive }).packs.map(
        ({ count }) => count,
      ),
    );
    expect(counts).toEqual([
      [1, 0],
      [0, 1],
    ]);
  });

  it('takes K at a position of its range', () => {
    const model = aModel([aDrive({ troughWidth: { low: 0.4, central: 0.5, high: 0.7 } })]);
    const widths = ([0, 1, 2, 3, 4] as const).map(
      (position) => fieldOf(model, { position, faces: [] }).smallestWidth,
    );
    for (const [k, width] of [8, 9, 10, 12, 14].entries()) expect(widths[k]).toBeCloseTo(width, 12);
  });

  it('the smallest width is that of the shallowest part', () => {
    const model = aModel([
      aDrive({
        axis: [
          [-40, 0, -20],
          [40, 0, -12],
        ],
      }),
    ]);
    const { smallestWidth } = fieldOf(model);
    // 6 m at its end; a part has the width of its middle
    expect(smallestWidth).toBeGreaterThan(6);
    expect(smallestWidth).toBeLessThan(6.1);
  });
});

describe('fieldAtPoints', () => {
  it('multiplies each group by its factor and adds them', () => {
    const model = aModel([
      aDrive(),
      aDrive({ volumeLoss: { low: 0.01, central: 0.015, high: 0.03 } }),
    ]);
    const field = fieldOf(model);
    const settlement = (factors: number[]) =>
      fieldAtPoints(field, Float64Array.of(0, 0, 0, 10), factors)[FIELD_SIZE + FIELD.settlement];
    const one = settlement([1, 0]) ?? NaN;
    // 16.9197 mm, the error curve at i
    expect(one * 1000).toBeCloseTo(16.9197 * Math.exp(-0.5), 3);
    expect(settlement([0, 1])).toBeCloseTo(one, 15);
    expect(settlement([2, 0.5])).toBeCloseTo(2.5 * one, 15);
    expect(settlement([0, 0])).toBe(0);
  });
});

describe('the later factor', () => {
  it('multiplies what its drive moves, and nothing else', () => {
    const at = (laterFactor: number) => {
      const model = aModel([aDrive(), aDrive({ laterFactor, volumeLoss: certain(0.01) })]);
      return fieldAtPoints(fieldOf(model), Float64Array.of(0, 0), [1, 1])[FIELD.settlement] ?? NaN;
    };
    // 16.9197 mm and 1.6 times 11.2798 mm
    expect(at(1.6) * 1000).toBeCloseTo(16.9197 + 1.6 * 11.2798, 3);
    expect(at(1) * 1000).toBeCloseTo(16.9197 + 11.2798, 3);
  });
});
