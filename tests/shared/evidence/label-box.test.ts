import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { labelBoxOf, labelCorners, labelsMeet } from '../../../shared/evidence/label-box.ts';
import { aLabelBox, holdsSpot, labelBoxes, spotsOf } from '../../support/label-boxes.ts';
import { holds } from '../../support/property.ts';

describe('labelCorners', () => {
  it('of a turned box are its own ground', () => {
    holds(labelBoxes, (box) => {
      const { middle: [x, y], halfWide, halfTall } = box; // prettier-ignore
      const corners = labelCorners(box);
      expect(corners).toHaveLength(4);
      for (const [a, b] of corners)
        expect(Math.hypot(a - x, b - y)).toBeCloseTo(Math.hypot(halfWide, halfTall), 9);
    });
  });

  it('of a rectangle of the paper are its corners', () => {
    const box = labelBoxOf({ left: 2, top: 3, right: 12, bottom: 7 });
    expect(labelCorners(box)).toEqual([[2, 3], [12, 3], [12, 7], [2, 7]]); // prettier-ignore
  });
});

describe('labelsMeet', () => {
  it('is said of every two that share ground, either way round', () => {
    holds(fc.tuple(labelBoxes, labelBoxes), ([a, b]) => {
      const shares = spotsOf(a).some((spot) => holdsSpot(b, spot)) || spotsOf(b).some((spot) => holdsSpot(a, spot)); // prettier-ignore
      if (shares) expect(labelsMeet(a, b)).toBe(true);
      expect(labelsMeet(b, a)).toBe(labelsMeet(a, b));
    }, 1000); // prettier-ignore
  });

  it('is not said of two that only touch', () => {
    expect(labelsMeet(aLabelBox([10, 10]), aLabelBox([20, 10]))).toBe(false);
    expect(labelsMeet(aLabelBox([10, 10]), aLabelBox([19.9, 10]))).toBe(true);
  });

  it('is not said of two askew that only the boxes round them share', () => {
    const along = [Math.SQRT1_2, Math.SQRT1_2] as const;
    const box = { ...aLabelBox([10, 10]), along };
    expect(labelsMeet(box, { ...box, middle: [14, 6] })).toBe(false);
  });
});
