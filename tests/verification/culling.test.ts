import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { certain } from '../../shared/numerics/range.ts';
import { placeOf } from '../../shared/ground/place.ts';
import { siteOf } from '../../shared/ground/site.ts';
import { aModel } from '../support/builders.ts';
import { bentAxes, drawnDrives, pointsWithin } from '../support/drawn-schemes.ts';
import { kernelMovements } from '../support/field-against-sinks.ts';
import { holds, numbers } from '../support/property.ts';

/** Two drives and a point some way off, near and far. */
const cases = fc.record({
  drives: fc.tuple(drawnDrives(bentAxes), drawnDrives(bentAxes)),
  point: fc.oneof(pointsWithin(40), pointsWithin(150), pointsWithin(600)),
  founding: numbers(-5, 0),
});

describe('site culling leaves out less than it says', () => {
  it.each(['clay', 'constant', 'oreilly-new-clay', 'oreilly-new-sand'] as const)(
    'with the depth rule %s',
    (kind) => {
      let culled = 0;
      holds(
        cases,
        ({ drives, point, founding }) => {
          const model = aModel(drives, { depth: { kind } });
          const state = { position: 2, faces: [] } as const;
          const levels = { ground: 0, founding };
          const points = Float64Array.from(point);
          const [got, wanted] = [true, false].map((culling) =>
            kernelMovements(model, levels, state, points, { V_L: 'high', culling }),
          );
          const [S, all] = [got?.[0]?.S ?? NaN, wanted?.[0]?.S ?? NaN];
          expect(Math.abs(S - all)).toBeLessThan(1e-9);
          for (const [k, curvature] of (got?.[0]?.curvature ?? [NaN]).entries()) {
            const whole = wanted?.[0]?.curvature[k] ?? NaN;
            expect(Math.abs(curvature - whole)).toBeLessThan(1e-10);
          }
          const place = placeOf([{ start: point, end: point }], 0, founding);
          culled += model.blocks.length - siteOf(model, place).blocks.length;
        },
        100,
      );
      // else the test would show nothing
      expect(culled).toBeGreaterThan(100);
    },
  );

  it('a drive that loses nothing is culled, one beside the place never', () => {
    holds(fc.tuple(drawnDrives(bentAxes), pointsWithin(5)), ([drive, point]) => {
      const place = placeOf([{ start: point, end: point }], 0, 0);
      const model = aModel([drive]);
      expect(siteOf(model, place).blocks.length).toBeGreaterThan(0);
      const far = placeOf([{ start: [2000, 0], end: [2000, 1] }], 0, 0);
      expect(siteOf(model, far).blocks).toEqual([]);
      const idle = aModel([{ ...drive, volumeLoss: certain(0) }]);
      expect(siteOf(idle, far).blocks).toEqual([]);
    });
  });
});
