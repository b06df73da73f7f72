import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { assessCaseWall } from '../../shared/assessment/assess-case-wall.ts';
import { modelOfCase } from '../../shared/assessment/model-of-case.ts';
import { MethodError } from '../../shared/method-error.ts';
import { assessCaseSchema } from '../../shared/schemas/assess-case.ts';
import { notFinite } from '../support/not-finite.ts';
import { holds, numbers } from '../support/property.ts';

const V_L = fc.oneof(
  fc.constantFrom<number | [number, number, number]>(0, [0, 0, 0], [0, 0, 0.02], [0, 0.01, 0.02]),
  numbers(0, 0.2),
);
const K = fc.constantFrom<number | [number, number, number]>(
  0.05,
  0.5,
  2,
  [0.3, 0.5, 0.7],
  [0.4, 0.4, 0.4],
);
/** Lengths from what is hardly a wall to a long one. */
const lengths = fc.constantFrom(1.5e-3, 0.01, 0.1, 0.4999, 0.5, 0.75, 3, 40, 900);
const faces = fc.constantFrom(undefined, -50, 0, 1e-9, 99.999, 100, 199.99, 200, 1e6);

const cases = fc
  .record({
    volumeLoss: V_L,
    troughWidth: K,
    faceChainage: faces,
    faceShare: fc.constantFrom(0.01, 0.275, 0.5, 0.99),
    level: fc.constantFrom(-6, -12, -25),
    rise: fc.constantFrom(0, 3, -3),
    depth: fc.constantFrom('clay', 'constant', 'oreilly-new-clay', 'oreilly-new-sand'),
    cutoff: fc.constantFrom<number | '2.5i'>(0, 0.001, 0.1, '2.5i'),
    at: fc.tuple(fc.constantFrom(-1, 0, 100, 200, 5000), fc.constantFrom(0, 3, 10, 25, 400)),
    angle: fc.constantFrom(0, Math.PI / 2, 1),
    length: lengths,
    foundingLevel: fc.constantFrom(0, -1, -4),
    eOverG: fc.constantFrom<number | [number, number]>(0.001, 2.6, [0.5, 12.5]),
    poisson: fc.constantFrom(0, 0.3, 0.5),
    height: fc.constantFrom(0.01, 8, 500),
  })
  .map(({ level, rise, depth, cutoff, at, angle, length, ...its }) => ({
    groundLevel: 0,
    rules: { depth, cutoff },
    drives: [
      {
        name: 'A',
        axis: [
          [0, 0, level],
          [200, 0, level + rise],
        ],
        diameter: 6,
        volumeLoss: its.volumeLoss,
        troughWidth: its.troughWidth,
        faceShare: its.faceShare,
        ...(its.faceChainage === undefined ? {} : { faceChainage: its.faceChainage }),
      },
    ],
    walls: [
      {
        name: 'wall',
        from: at,
        to: [at[0] + length * Math.cos(angle), at[1] + length * Math.sin(angle)],
        foundingLevel: its.foundingLevel,
        height: its.height,
        eOverG: its.eOverG,
        poisson: its.poisson,
      },
    ],
  }));

describe('the method: never NaN, whatever the input', { timeout: 60_000 }, () => {
  it('a case that the schema takes is refused by name or answered with finite numbers', () => {
    const seen = { answered: 0, refused: 0 };
    holds(
      fc.noShrink(cases),
      (drawn) => {
        const { walls, ...input } = assessCaseSchema.parse(drawn);
        const [wall] = walls;
        if (wall === undefined) expect.unreachable();
        try {
          expect(notFinite(assessCaseWall(modelOfCase(input), wall))).toEqual([]);
          seen.answered++;
        } catch (error) {
          if (!(error instanceof MethodError)) throw error;
          expect(error.field).toBeDefined();
          seen.refused++;
        }
      },
      800,
    );
    expect(seen.answered).toBeGreaterThan(300);
    expect(seen.refused).toBeGreaterThan(10);
  });
});
