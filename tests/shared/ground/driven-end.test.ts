import { describe, expect, it } from 'vitest';
import type { SpacePoint } from '../../../shared/geometry/point.ts';
import type { Drive } from '../../../shared/ground/drive.ts';
import { drivenEnd, pieceAtChainage } from '../../../shared/ground/driven-end.ts';
import { piecesOfDrive } from '../../../shared/ground/pieces-of-drive.ts';
import { certain } from '../../../shared/numerics/range.ts';
import { aDrive } from '../../support/builders.ts';

/** The end of a drive of 1,000 m at ground level 0, where i is K times the axis depth. */
function end(face: number | undefined, share: number, drive: Drive = aDrive()): number {
  const pieces = piecesOfDrive(drive, 0, []);
  return drivenEnd(pieces, 1000, face, share, (piece, axis) => -piece.troughWidth.central * axis);
}

/** Φ⁻¹(0.275) from tables, to its six digits; i is 10 m. */
const SHIFT = 5.9776;
const DIGITS = 4;

describe('drivenEnd', () => {
  it('attewell-woodman-1982: half above the face is no shift', () => {
    expect(end(500, 0.5)).toBe(500);
  });

  it('mair-taylor-1997: a share of 27.5 % puts it 0.598 i behind the face', () => {
    expect(end(500, 0.275)).toBeCloseTo(500 - SHIFT, DIGITS);
  });

  it('a share over half puts it before the face by as much', () => {
    expect(end(500, 0.725)).toBeCloseTo(500 + SHIFT, DIGITS);
  });

  it.each([undefined, 1000, 1000.01, 1e9])('a face at %s is complete and unshifted', (face) => {
    expect(end(face, 0.275)).toBe(1000);
  });

  it.each([0, -0.01, -1e9])('a face at %d m has not begun', (face) => {
    expect(end(face, 0.725)).toBe(0);
  });

  it('is not shifted beyond either end', () => {
    expect(end(3, 0.275)).toBe(0);
    expect(end(998, 0.725)).toBe(1000);
  });

  it('takes i at the level of the face', () => {
    const axis: SpacePoint[] = [
      [0, 0, -20],
      [1000, 0, -40],
    ];
    // −30 m at 500 m: i is 15 m
    expect(end(500, 0.275, aDrive({ axis }))).toBeCloseTo(500 - 1.5 * SHIFT, DIGITS);
  });

  it('takes K of the interval that the face is in', () => {
    const intervals = [{ from: 500, to: 600, troughWidth: certain(0.3) }];
    // the interval begins at 500 m, which belongs to it
    expect(end(500, 0.275, aDrive({ intervals }))).toBeCloseTo(500 - 0.6 * SHIFT, DIGITS);
    expect(end(499.99, 0.275, aDrive({ intervals }))).toBeCloseTo(499.99 - SHIFT, DIGITS);
  });

  it('does not shift where there is no width', () => {
    expect(end(500, 0.275, aDrive({ troughWidth: certain(-1) }))).toBe(500);
  });
});

describe('pieceAtChainage', () => {
  const pieces = piecesOfDrive(
    aDrive({
      axis: [
        [0, 0, -20],
        [10, 0, -20],
        [30, 0, -20],
      ],
    }),
    0,
    [],
  );

  it.each([
    [-5, 0],
    [0, 0],
    [9.999, 0],
    [10, 10],
    [29.999, 10],
    [30, 10],
    [99, 10],
  ])('%d m is in the piece that begins at %d m', (chainage, from) => {
    expect(pieceAtChainage(pieces, chainage)?.from).toBe(from);
  });

  it('there is none in a drive without pieces', () => {
    expect(pieceAtChainage([], 0)).toBeUndefined();
    expect(drivenEnd([], 0, 5, 0.275, () => 1)).toBe(0);
  });
});
