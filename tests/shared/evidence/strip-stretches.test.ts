import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { groundFrame } from '../../../shared/evidence/ground-frame.ts';
import { lineOnGround } from '../../../shared/evidence/line-on-ground.ts';
import { stripStretches } from '../../../shared/evidence/strip-stretches.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { beyond } from '../../support/marks.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';
import { holds, numbers } from '../../support/property.ts';

const WINDOW = { left: 0, top: 0, right: 290, bottom: 256 };

/** Lines of some hundred metres to kilometres, as drives run: long parts that turn a little. */
const lines = fc
  .tuple(
    numbers(-Math.PI, Math.PI),
    fc.array(fc.tuple(numbers(-0.3, 0.3), numbers(40, 400)), { minLength: 1, maxLength: 12 }),
  )
  .map(([start, parts]) => {
    let [x, y, heading] = [500_000, 5_900_000, start];
    const line: PlanPoint[] = [[x, y]];
    for (const [turn, length] of parts) {
      heading += turn;
      [x, y] = [x + length * Math.cos(heading), y + length * Math.sin(heading)];
      line.push([x, y]);
    }
    return lineOnGround(line);
  });
const strips = fc.record({
  line: lines,
  denominator: fc.constantFrom(500, 1000, 1250),
  overlap: numbers(0, 30),
});

function laidOut({ line, denominator, overlap }: { line: ReturnType<typeof lineOnGround>; denominator: number; overlap: number }) {
  const metres = denominator / 1000;
  const ground = { wide: WINDOW.right * metres, tall: WINDOW.bottom * metres };
  return stripStretches(line, { ...ground, from: 0, to: line.length, overlap, most: 200 });
} // prettier-ignore

describe('stripStretches', () => {
  it('covers the whole line, each sheet going on where the one before ends less the overlap', () => {
    holds(strips, (strip) => {
      const stretches = laidOut(strip);
      expect(stretches[0]?.from).toBe(0);
      expect(stretches.at(-1)?.to).toBe(strip.line.length);
      for (const [k, { from, to }] of stretches.slice(1).entries()) {
        const before = stretches[k]?.to ?? NaN;
        expect(before - from).toBeGreaterThanOrEqual(strip.overlap - 1e-9);
        expect(to).toBeGreaterThan(before);
      }
    });
  });

  it('keeps the line within the window of each sheet, with room beside it', () => {
    holds(strips, (strip) => {
      for (const { from, to, centre, right } of laidOut(strip)) {
        const { denominator, line } = strip;
        const frame = groundFrame(WINDOW, { centre, right, denominator });
        for (let station = from; station <= to; station += 5) {
          const [x, y] = frame.place(line.pointAt(station));
          expect(beyond(WINDOW, [x, y])).toBe(0);
          expect(Math.min(y - WINDOW.top, WINDOW.bottom - y)).toBeGreaterThan(50);
        }
      }
    });
  });

  it('lies along the line, larger chainages at the right', () => {
    holds(strips, (strip) => {
      for (const { from, to, right } of laidOut(strip)) {
        const [[x, y], [a, b]] = [strip.line.pointAt(from), strip.line.pointAt(to)];
        expect(Math.hypot(...right)).toBeCloseTo(1, 9);
        expect((a - x) * right[0] + (b - y) * right[1]).toBeCloseTo(Math.hypot(a - x, b - y), 3);
      }
    });
  });

  const straight = lineOnGround([[0, 0], [1000, 0]]); // prettier-ignore
  const GROUND = { wide: 200, tall: 150, from: 0, to: 1000, most: 200 };

  it('takes no more sheets than a straight line needs', () => {
    const spans = stripStretches(straight, { ...GROUND, overlap: 20 });
    // each shows up to 184 m, 164 m of them new
    expect(spans).toHaveLength(6);
  });

  it('refuses an overlap that leaves nothing of a sheet', () => {
    const refused = methodErrorOf(() => stripStretches(straight, { ...GROUND, overlap: 190 }));
    expect(refused).toEqual({ code: 'outside-range', field: 'overlap' });
  });

  it('refuses a line that bends too sharply for the scale', () => {
    const zigzag = lineOnGround(
      Array.from({ length: 400 }, (_, k): PlanPoint => [0.05 * k, k % 2 === 0 ? 0 : 0.5]),
    );
    const spans = () => stripStretches(zigzag, { ...GROUND, to: zigzag.length, overlap: 0 });
    expect(methodErrorOf(spans)).toEqual({ code: 'outside-range', field: 'denominator' });
  });

  it('stops at one sheet more than may be', () => {
    const spans = stripStretches(straight, { ...GROUND, overlap: 183.99, most: 30 });
    expect(spans).toHaveLength(31);
  });
});
