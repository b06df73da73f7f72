import { describe, expect, it } from 'vitest';
import type { SpacePoint } from '../../shared/geometry/point.ts';
import { certain } from '../../shared/numerics/range.ts';
import { aboutBend, bendOf } from '../support/arcs.ts';
import { aDrive } from '../support/builders.ts';
import { expectShares, gridAbout } from '../support/field-against-sinks.ts';
import { kernelAgainstSinks, type QuadratureCase } from '../support/quadrature-case.ts';
import { chordsOf } from '../support/sink-path.ts';

/**
 * What the method allows that halving the pieces may change: 0.1 % and 0.01 mm of S. The
 * pieces differ from the sinks in i alone, which each derivative feels once more: S goes with 1/i,
 * slope with 1/i², curvature with 1/i³, u and strain with one i²/f less.
 */
function expectWithinTheMethod(checked: QuadratureCase): void {
  const found = kernelAgainstSinks(checked);
  expect(found.S.worst).toBeLessThan(1e-5);
  expectShares(found, { S: 0.001, slope: 0.002, curvature: 0.003, u: 0.002, strain: 0.003 });
}

/** 600 m from 14 m under datum, given by its two ends. */
function twoPoints(gradient: number): SpacePoint[] {
  return [
    [-300, 0, -14],
    [300, 0, -14 - 600 * gradient],
  ];
}

const places = [-200, 0, 200].map((E) => gridAbout([E, 0], 40, 11));

describe('attewell-woodman-1982 by pieces on a gradient, against point sinks of changing i', () => {
  it.each([0.002, 0.005, 0.01, 0.02, 0.03, 0.04, 0.05])('600 m by two points at %d', (gradient) => {
    const drives = [aDrive({ axis: twoPoints(gradient) })];
    for (const points of places) expectWithinTheMethod({ drives, points });
  });

  it.each(['constant', 'oreilly-new-clay', 'oreilly-new-sand'] as const)(
    '600 m by two points at 0.04, depth rule %s, founded 3 m deep',
    (kind) => {
      const drives = [aDrive({ axis: twoPoints(0.04), troughWidth: certain(0.4) })];
      const levels = { ground: 0, founding: -3 };
      for (const points of places) {
        expectWithinTheMethod({ drives, points, depth: { kind }, levels });
      }
    },
  );

  it('600 m by two points at 4 %, deep focus and a closed face', () => {
    const drives = [aDrive({ axis: twoPoints(0.04), faceShare: 0.275 })];
    const [, points] = places;
    if (points === undefined) expect.unreachable();
    expectWithinTheMethod({ drives, points, focus: 'deep', faces: [305] });
  });

  it('600 m by two points at 4 % with D and K by intervals', () => {
    const intervals = [
      { from: 100, to: 310, diameter: 7 },
      { from: 310, to: 400, troughWidth: certain(0.6) },
    ];
    const drives = [aDrive({ axis: twoPoints(0.04), intervals })];
    for (const points of places) expectWithinTheMethod({ drives, points });
  });

  it.each([0.01, 0.03, 0.05])('chords of 5 m in a bend of 250 m at %d', (gradient) => {
    const drives = [aDrive({ axis: chordsOf(bendOf(250, gradient), 5) })];
    expectWithinTheMethod({ drives, points: aboutBend(250) });
  });

  it('crossing twin drives, one rising and one falling', () => {
    const drives = [
      aDrive({ axis: twoPoints(0.03) }),
      aDrive({
        axis: [
          [200, -150, -30],
          [-200, 150, -18],
        ],
        laterFactor: 1.3,
      }),
    ];
    for (const points of places) expectWithinTheMethod({ drives, points });
  });
});
