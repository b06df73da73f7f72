import { describe, expect, it } from 'vitest';
import type { SpacePoint } from '../../../shared/geometry/point.ts';
import { levelAlong } from '../../../shared/ground/piece.ts';
import { piecesOfDrive } from '../../../shared/ground/pieces-of-drive.ts';
import { certain } from '../../../shared/numerics/range.ts';
import { aDrive, aModel } from '../../support/builders.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';

/** 30 m east and 40 m north, then 50 m east; level. */
const axis: SpacePoint[] = [
  [0, 0, -20],
  [30, 40, -20],
  [80, 40, -20],
];

describe('piecesOfDrive', () => {
  it('cuts at vertices; chainage is plan length', () => {
    const pieces = piecesOfDrive(aDrive({ axis }), 3, []);
    expect(pieces).toMatchObject([
      { drive: 3, group: 0, from: 0, length: 50, cosEast: 0.6, cosNorth: 0.8 },
      { drive: 3, group: 0, from: 50, length: 50, cosEast: 1, cosNorth: 0 },
    ]);
  });

  it('cuts where inputs change', () => {
    const intervals = [{ from: 20, to: 60, diameter: 7 }];
    const pieces = piecesOfDrive(aDrive({ axis, intervals }), 0, []);
    expect(pieces.map(({ from, length, diameter }) => [from, length, diameter])).toEqual([
      [0, 20, 6],
      [20, 30, 7],
      [50, 10, 7],
      [60, 40, 6],
    ]);
  });

  it('carries V_s of the unit loss, times the factor of a later drive', () => {
    // 1.5 % of π/4 · 36 m², then 1.3 times that
    expect(piecesOfDrive(aDrive(), 0, [])[0]?.unitLoss).toBeCloseTo(0.424115, 7);
    expect(piecesOfDrive(aDrive({ laterFactor: 1.3 }), 0, [])[0]?.unitLoss).toBeCloseTo(
      0.5513495,
      7,
    );
  });

  it('cuts a gradient every tenth of a diameter of level at most', () => {
    const falling: SpacePoint[] = [
      [0, 0, -20],
      [100, 0, -23],
    ];
    const pieces = piecesOfDrive(aDrive({ axis: falling }), 0, []);
    for (const { startLevel, endLevel } of pieces) {
      // the last digit of −23
      expect(startLevel - endLevel).toBeLessThanOrEqual(0.6 + 1e-12);
    }
    expect(pieces[0]?.startLevel).toBe(-20);
    expect(pieces.at(-1)?.endLevel).toBe(-23);
    const total = pieces.reduce((sum, { length }) => sum + length, 0);
    expect(total).toBeCloseTo(100, 12);
  });

  it('follows the level along a piece', () => {
    const [piece] = piecesOfDrive(
      aDrive({
        axis: [
          [0, 0, -20],
          [10, 0, -20.5],
        ],
      }),
      0,
      [],
    );
    if (piece === undefined) expect.unreachable();
    expect(levelAlong(piece, 0)).toBe(-20);
    expect(levelAlong(piece, 4)).toBeCloseTo(-20.2, 12);
    expect(levelAlong(piece, 10)).toBe(-20.5);
  });

  it('refuses a vertex on the one before it in plan, and a drive of one point', () => {
    const vertical: SpacePoint[] = [
      [0, 0, -20],
      [5, 0, -20],
      [5, 0, -30],
    ];
    const refused = methodErrorOf(() => piecesOfDrive(aDrive({ axis: vertical }), 0, []));
    expect(refused).toEqual({ code: 'zero-length', field: 'axis[2]' });
    const short = methodErrorOf(() => piecesOfDrive(aDrive({ axis: [[0, 0, 0]] }), 0, []));
    expect(short).toEqual({ code: 'zero-length', field: 'axis' });
  });
});

describe('groundModel', () => {
  it('names the drive at fault', () => {
    const bad = aDrive({ intervals: [{ from: 9, to: 3, volumeLoss: certain(0) }] });
    expect(methodErrorOf(() => aModel([aDrive(), bad]))).toEqual({
      code: 'bad-intervals',
      field: 'drives[1].intervals[0]',
    });
    const pointlike = aDrive({ axis: [] });
    expect(methodErrorOf(() => aModel([pointlike])).field).toBe('drives[0].axis');
  });

  it('knows the length of each drive', () => {
    expect(aModel([aDrive(), aDrive({ axis })]).lengths).toEqual([1000, 100]);
  });
});
