import { describe, expect, it } from 'vitest';
import type { DriveInterval } from '../../../shared/ground/drive.ts';
import { sectionsOfDrive } from '../../../shared/ground/sections-of-drive.ts';
import { certain } from '../../../shared/numerics/range.ts';
import { aDrive } from '../../support/builders.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';

/** The sections of a drive of 100 m with D 6 m, as [from, to, D]. */
function sections(...intervals: DriveInterval[]): [number, number, number][] {
  return sectionsOfDrive(aDrive({ intervals }), 100).map(({ from, to, diameter }) => [
    from,
    to,
    diameter,
  ]);
}

describe('sectionsOfDrive', () => {
  it('is the drive where there are no intervals', () => {
    expect(sections()).toEqual([[0, 100, 6]]);
  });

  it('keeps the drive between intervals, in the order of chainage', () => {
    expect(sections({ from: 60, to: 80, diameter: 8 }, { from: 20, to: 40, diameter: 7 })).toEqual([
      [0, 20, 6],
      [20, 40, 7],
      [40, 60, 6],
      [60, 80, 8],
      [80, 100, 6],
    ]);
  });

  it('intervals may touch', () => {
    expect(sections({ from: 0, to: 50, diameter: 7 }, { from: 50, to: 100, diameter: 8 })).toEqual([
      [0, 50, 7],
      [50, 100, 8],
    ]);
  });

  it('what lies beyond the ends is dropped', () => {
    expect(
      sections(
        { from: -20, to: -10, diameter: 9 },
        { from: -10, to: 30, diameter: 7 },
        { from: 90, to: 500, diameter: 8 },
        { from: 500, to: 600, diameter: 9 },
      ),
    ).toEqual([
      [0, 30, 7],
      [30, 90, 6],
      [90, 100, 8],
    ]);
  });

  it('an interval takes from the drive what it does not give', () => {
    const drive = aDrive({ intervals: [{ from: 0, to: 100, troughWidth: certain(0.3) }] });
    expect(sectionsOfDrive(drive, 100)).toEqual([
      {
        from: 0,
        to: 100,
        diameter: 6,
        volumeLoss: certain(0.015),
        troughWidth: certain(0.3),
      },
    ]);
  });

  it.each<[string, DriveInterval[], string]>([
    [
      'overlap',
      [
        { from: 0, to: 51 },
        { from: 50, to: 100 },
      ],
      'intervals[1]',
    ],
    [
      'overlap, given backwards',
      [
        { from: 50, to: 100 },
        { from: 0, to: 51 },
      ],
      'intervals[0]',
    ],
    [
      'one inside another',
      [
        { from: 0, to: 90 },
        { from: 10, to: 20 },
      ],
      'intervals[1]',
    ],
    ['run backwards', [{ from: 50, to: 40 }], 'intervals[0]'],
    ['have no length', [{ from: 50, to: 50 }], 'intervals[0]'],
    ['are not numbers', [{ from: NaN, to: 50 }], 'intervals[0]'],
  ])('refuses intervals that %s', (_, intervals, field) => {
    expect(methodErrorOf(() => sections(...intervals))).toEqual({ code: 'bad-intervals', field });
  });
});
