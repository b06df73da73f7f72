import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { LabelBox } from '../../../shared/evidence/label-box.ts';
import { placeLabels } from '../../../shared/evidence/place-labels.ts';
import { aLabelBox, holdsSpot, labelBoxes, spotsOf } from '../../support/label-boxes.ts';
import { beyond } from '../../support/marks.ts';
import { holds } from '../../support/property.ts';

const WINDOW = { left: 0, top: 0, right: 120, bottom: 90 };
const wantedLabels = fc
  .array(fc.array(labelBoxes, { maxLength: 4 }), { maxLength: 40 })
  .map((all) => all.map((spots, what) => ({ what, spots })));
const plans = fc.record({ taken: fc.array(labelBoxes, { maxLength: 4 }), wanted: wantedLabels });

function meet(one: LabelBox, other: LabelBox): boolean {
  return (
    spotsOf(one).some((spot) => holdsSpot(other, spot)) ||
    spotsOf(other).some((spot) => holdsSpot(one, spot))
  );
}

describe('placeLabels', () => {
  it('places or lists each in its order', () => {
    holds(plans, ({ taken, wanted }) => {
      const { placed, listed } = placeLabels(WINDOW, taken, wanted);
      const whats = placed.map(({ what }) => what);
      for (const some of [whats, listed]) expect(some).toEqual([...some].sort((a, b) => a - b));
      expect([...whats, ...listed].sort((a, b) => a - b)).toEqual(wanted.map(({ what }) => what));
      for (const { what, box } of placed) expect(wanted[what]?.spots).toContain(box);
    });
  });

  it('places none over another or over what was taken', () => {
    holds(plans, ({ taken, wanted }) => {
      const boxes = placeLabels(WINDOW, taken, wanted).placed.map(({ box }) => box);
      for (const [k, box] of boxes.entries()) {
        const others = [...taken, ...boxes.slice(0, k)];
        expect(others.filter((other) => meet(box, other))).toEqual([]);
      }
    });
  });

  it('places none outside of the window', () => {
    holds(plans, ({ taken, wanted }) => {
      for (const { box } of placeLabels(WINDOW, taken, wanted).placed) {
        expect(spotsOf(box).filter((spot) => beyond(WINDOW, spot) > 1e-9)).toEqual([]);
      }
    });
  });

  it('takes the best spot that is free', () => {
    const [first, second, third] = [aLabelBox([20, 20]), aLabelBox([20, 22]), aLabelBox([60, 20])];
    const placement = placeLabels(WINDOW, [], [
      { what: 'a', spots: [first, third] },
      { what: 'b', spots: [second, third] },
      { what: 'c', spots: [third] },
    ]); // prettier-ignore
    expect(placement).toEqual({
      placed: [
        { what: 'a', box: first },
        { what: 'b', box: third },
      ],
      listed: ['c'],
    });
  });
});
