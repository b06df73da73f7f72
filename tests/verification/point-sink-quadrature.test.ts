import { describe, expect, it } from 'vitest';
import { certain, rangeOf } from '../../shared/numerics/range.ts';
import { aboutBend, bendOf } from '../support/arcs.ts';
import { aDrive } from '../support/builders.ts';
import { expectShares, gridAbout } from '../support/field-against-sinks.ts';
import { kernelAgainstSinks, type QuadratureCase } from '../support/quadrature-case.ts';
import { chordsOf, pathRound } from '../support/sink-path.ts';

/**
 * On a level chord the kernel is exact but for its table, good to 1e-11 of one piece's largest value;
 * some forty pieces reach a point.
 */
const EXACT = 4e-10;

const onStraight = { points: gridAbout([0, 0], 40, 13) };
const onBend = { points: aboutBend(250) };
const straight = aDrive();
const bend = aDrive({ axis: chordsOf(bendOf(250), 5) });
const closedFace = { faceShare: 0.275 };
/** A building on higher ground with a basement. */
const levels = { ground: 3, founding: -5 };
const deep = { focus: 'deep', levels } as const;
const volumeLoss = rangeOf([0.01, 0.015, 0.02]);
const changing = aDrive({
  volumeLoss,
  troughWidth: rangeOf([0.4, 0.5, 0.6]),
  intervals: [
    { from: 300, to: 480.5, diameter: 7.5 },
    { from: 480.5, to: 505, volumeLoss: rangeOf([0.005, 0.03, 0.04]) },
    { from: 505, to: 900, troughWidth: rangeOf([0.45, 0.6, 0.7]), volumeLoss },
  ],
});
const later = aDrive({ axis: [[-500, 18, -22], [500, 12, -22]], laterFactor: 1.3 }); // prettier-ignore
const layers = [
  { baseLevel: -9, troughWidth: certain(0.3) },
  { baseLevel: -40, troughWidth: certain(0.5) },
];

const cases: [string, QuadratureCase][] = [
  ['a straight drive', { drives: [straight], ...onStraight }],
  ['an open face', { drives: [straight], faces: [500], ...onStraight }],
  ['a closed face', { drives: [{ ...straight, ...closedFace }], faces: [497.3], ...onStraight }],
  ['a bend of 250 m', { drives: [bend], ...onBend }],
  [
    'a bend of 400 m',
    { drives: [aDrive({ axis: chordsOf(bendOf(400), 5) })], points: aboutBend(400) },
  ],
  ['an open face in a bend', { drives: [bend], faces: [230], ...onBend }],
  ['a closed face in a bend', { drives: [{ ...bend, ...closedFace }], faces: [226], ...onBend }],
  ['a basement', { drives: [bend], levels, ...onBend }],
  ['the deep focus', { drives: [bend], ...deep, faces: [230], ...onBend }],
  [
    'the deep focus, a closed face',
    { drives: [{ ...bend, ...closedFace }], ...deep, faces: [226], ...onBend },
  ],
  ...(['constant', 'oreilly-new-clay', 'oreilly-new-sand'] as const).map(
    (kind): [string, QuadratureCase] => [
      `the depth rule ${kind}`,
      { drives: [{ ...bend, ...closedFace }], depth: { kind }, levels, faces: [226], ...onBend },
    ],
  ),
  [
    'layers',
    { drives: [bend], depth: { kind: 'layered', layers }, levels, faces: [230], ...onBend },
  ],
  ['D, V_L and K by intervals', { drives: [changing], ...onStraight }],
  [
    'a closed face in an interval',
    { drives: [{ ...changing, ...closedFace }], faces: [508], ...onStraight },
  ],
  ['K and V_L low', { drives: [changing], end: 'low', ...onStraight }],
  ['K and V_L high', { drives: [changing], end: 'high', ...onStraight }],
  ['twin drives, the later at 1.3', { drives: [straight, later], faces: [490], ...onStraight }],
];

describe('attewell-woodman-1982 by pieces, against point sinks along the same level chords', () => {
  it.each(cases)('%s', (_, checked) => {
    expectShares(kernelAgainstSinks(checked), {
      S: EXACT,
      slope: EXACT,
      curvature: EXACT,
      u: EXACT,
      strain: EXACT,
    });
  });
});

describe('chords of 5 m against point sinks along the true arc', () => {
  it.each([250, 300, 400])('of radius %d m', (radius) => {
    const found = kernelAgainstSinks({
      drives: [aDrive({ axis: chordsOf(bendOf(radius), 5) })],
      path: pathRound(bendOf(radius)),
      points: aboutBend(radius),
    });
    // chords lie inside the arc by c²/12R on average: each quantity is off by that times its next
    // derivative, at most 0.607 S/i, S/i², 1.38 S/i³; a tenth more for the curve across the trough
    const off = (1.1 * (5 * 5)) / (12 * radius) / 10;
    expect(found.S.worst).toBeLessThan(1e-5);
    expectShares(found, {
      S: 0.607 * off,
      slope: off / 0.607,
      curvature: 1.38 * off,
      u: off / 0.607,
      strain: 1.38 * off,
    });
  });
});
