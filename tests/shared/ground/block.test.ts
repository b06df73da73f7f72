import { describe, expect, it } from 'vitest';
import type { SpacePoint } from '../../../shared/geometry/point.ts';
import { blockIsNegligible } from '../../../shared/ground/block-is-negligible.ts';
import { blocksOfPieces } from '../../../shared/ground/block.ts';
import { piecesOfDrive } from '../../../shared/ground/pieces-of-drive.ts';
import { placeOf } from '../../../shared/ground/place.ts';
import { aDrive, aModel } from '../../support/builders.ts';

/** Eight pieces of 10 m, the last three with other inputs; level but for the last. */
const axis = Array.from({ length: 9 }, (_, k): SpacePoint => [10 * k, 0, k < 8 ? -20 : -20.5]);
const drive = aDrive({
  axis,
  volumeLoss: { low: 0.01, central: 0.01, high: 0.02 },
  troughWidth: { low: 0.4, central: 0.5, high: 0.6 },
  intervals: [
    { from: 50, to: 80, diameter: 7, troughWidth: { low: 0.3, central: 0.5, high: 0.7 } },
  ],
});

describe('blocksOfPieces', () => {
  const blocks = blocksOfPieces(piecesOfDrive(drive, 0, []), [2]);

  it('takes six pieces that follow each other', () => {
    expect(blocks.map(({ pieces }) => pieces.map(({ from }) => from))).toEqual([
      [0, 10, 20, 30, 40, 50],
      [60, 70],
    ]);
  });

  it('knows what bounds them', () => {
    expect(blocks).toMatchObject([
      {
        box: { west: 0, east: 60, south: 0, north: 0 },
        highestAxis: -20,
        lowestAxis: -20,
        largestDiameter: 7,
        smallestK: 0.3,
        largestK: 0.7,
      },
      { box: { west: 60, east: 80 }, highestAxis: -20, lowestAxis: -20.5, largestDiameter: 7 },
    ]);
  });

  it('holds the volume at the high loss', () => {
    // 2 % of π/4 · 49 m² over 20 m
    expect(blocks[1]?.volume).toBeCloseTo(15.393804, 6);
  });
});

describe('blockIsNegligible', () => {
  const [block] = aModel([drive]).blocks;
  const negligibleAt = (E: number, founding = 0, volume = 1) => {
    if (block === undefined) expect.unreachable();
    const place = placeOf([{ start: [E, 0], end: [E, 1] }], 0, founding);
    return blockIsNegligible(
      { ...block, volume: volume * block.volume },
      place,
      { kind: 'clay' },
      2,
    );
  };

  // i is at most 14 m; a volume of 38 m³ is under 1e-9 m of settlement beyond some eight widths
  it('near the place it never is, far off it is', () => {
    expect(negligibleAt(80)).toBe(false);
    expect(negligibleAt(60 + 5 * 14)).toBe(false);
    expect(negligibleAt(60 + 9 * 14)).toBe(true);
  });

  it('within two widths it is not, however little is lost', () => {
    expect(negligibleAt(60 + 27.9, 0, 0)).toBe(false);
    expect(negligibleAt(60 + 28.1, 0, 0)).toBe(true);
  });

  it('the crown rule must see what rises to the founding level and what has no width', () => {
    expect(negligibleAt(5000, -16.5)).toBe(false);
    expect(negligibleAt(5000, -16.4)).toBe(true);
  });
});
