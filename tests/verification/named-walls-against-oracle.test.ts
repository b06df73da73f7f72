import { describe, expect, it } from 'vitest';
import type { PlanPoint, SpacePoint } from '../../shared/geometry/point.ts';
import { aDrive, aWall, someRules } from '../support/builders.ts';
import { bothWays, gapsOf, type Pair } from '../support/wall-against-oracle.ts';

const drives = [aDrive()];
const rules = someRules();

/** Both ways agree as closely as on any wall, sampled every 5 mm. */
function agreeing(pair: Pair): Pair {
  const { ends, settlement, strain } = gapsOf(pair);
  // under one sample, since both draw lines between theirs
  expect(ends).toBeLessThan(0.002);
  // 1e-7 of the largest settlement, 20 mm
  expect(settlement).toBeLessThan(2e-9);
  expect(strain).toBeLessThan(0.005);
  return pair;
}

function lines(from: PlanPoint, to: PlanPoint, faces: readonly (number | undefined)[] = []): Pair {
  return agreeing(bothWays({ drives, faces, rules }, aWall({ from, to }), 0.005));
}

function modes({ got }: Pair): string[] {
  return got.zones.map(({ mode }) => mode);
}

describe(
  'the method by sampling: single walls beside a straight drive',
  { timeout: 60_000 },
  () => {
    it('square to it', () => {
      const pair = lines([0, 2], [0, 28]);
      expect(modes(pair)).toEqual(['sagging', 'hogging']);
      // the known wall, to the digits printed
      expect(pair.wanted.strain * 100).toBeCloseTo(0.03788, 5);
    });

    it('parallel to it, complete: no curvature, no strain', () => {
      const { got } = lines([-20, 5], [20, 5]);
      expect(got).toMatchObject({ zones: [], strain: 0, category: 0 });
      expect(got.warnings).toEqual(['flat along the wall', 'not affected']);
    });

    it('parallel to it, under the face', () => {
      // S over the axis grows from 0 behind the face: hogging behind it, sagging ahead
      expect(modes(lines([-15, 5], [15, 5], [500]))).toEqual(['sagging', 'hogging']);
    });

    it.each([20, 45, 70])('skew to it by %d°', (degrees) => {
      const angle = (degrees * Math.PI) / 180;
      const [c, s] = [Math.cos(angle), Math.sin(angle)];
      expect(modes(lines([3 * c, 3 * s], [33 * c, 33 * s])).length).toBeGreaterThan(0);
    });

    it('wholly hogging', () => {
      expect(modes(lines([0, 12], [0, 22]))).toEqual(['hogging']);
    });

    it('wholly sagging', () => {
      expect(modes(lines([0, -8], [0, 7]))).toEqual(['sagging']);
    });

    it('0.8 m long', () => {
      expect(modes(lines([0, 14], [0, 14.8]))).toEqual(['hogging']);
    });

    it('0.45 m long: too short for a zone', () => {
      const { got } = lines([0, 14], [0, 14.45]);
      expect(got).toMatchObject({ zones: [], strain: 0, category: 0 });
      expect(got.warnings).toEqual(['short wall', 'not affected']);
    });

    it('partly past its end', () => {
      expect(modes(lines([480, 3], [530, 6]))).toEqual(['sagging', 'hogging']);
    });

    it('wholly outside its trough', () => {
      const { got } = lines([0, 60], [0, 90]);
      expect(got).toMatchObject({ zones: [], strain: 0, category: 0 });
      expect(got.warnings).toEqual(['not affected']);
    });
  },
);

describe('the method by sampling: further single walls', { timeout: 60_000 }, () => {
  it('five zones across two troughs', () => {
    const axis: SpacePoint[] = [
      [-500, 60, -20],
      [500, 60, -20],
    ];
    const wall = aWall({ from: [0, -18], to: [0, 78] });
    const pair = agreeing(bothWays({ drives: [...drives, aDrive({ axis })], rules }, wall, 0.005));
    expect(modes(pair)).toEqual(['hogging', 'sagging', 'hogging', 'sagging', 'hogging']);
  });

  it('in the coordinates of a national grid as near the origin', () => {
    const axis: SpacePoint[] = [
      [499_500, 6_000_000, -20],
      [500_500, 6_000_000, -20],
    ];
    const far = aWall({ from: [500_003.25, 6_000_002], to: [500_010.5, 6_000_028] });
    const near = aWall({ from: [3.25, 2], to: [10.5, 28] });
    const { wanted } = bothWays({ drives, rules }, near, 0.005);
    const { got } = bothWays({ drives: [aDrive({ axis })], rules }, far, 0.005);
    agreeing({ got, wanted });
    expect(modes({ got, wanted })).toEqual(['sagging', 'hogging']);
  });
});
