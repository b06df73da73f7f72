import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { MethodError } from '../../../shared/method-error.ts';
import { evaluateMonotoneCubic, monotoneCubic } from '../../../shared/numerics/monotone-cubic.ts';
import { holds, numbers } from '../../support/property.ts';

type Rows = [number, number][];

/** The data called RPN 14 in Fritsch and Carlson 1980, set down from memory. */
const RPN_14: Rows = [
  [7.99, 0],
  [8.09, 2.76429e-5],
  [8.19, 4.37498e-2],
  [8.7, 0.169183],
  [9.2, 0.469428],
  [10, 0.94374],
  [12, 0.998636],
  [15, 0.999919],
  [20, 0.999994],
];

/** Two to nine rows with growing arguments and any values. */
const tables = fc
  .array(fc.tuple(numbers(0.05, 3), numbers(-10, 10)), { minLength: 2, maxLength: 9 })
  .map((steps): Rows => {
    let x = -2;
    return steps.map(([width, value]) => [(x += width), value]);
  });

function value(rows: Rows, x: number, flatEnd = false): number {
  return evaluateMonotoneCubic(monotoneCubic(rows, flatEnd), x).value;
}

describe('monotoneCubic', () => {
  it('refuses a single row', () => {
    expect(() => monotoneCubic([[0, 1]])).toThrow(MethodError);
    expect(() => monotoneCubic([])).toThrow(MethodError);
  });

  it.each([
    [
      [
        [0, 1],
        [0, 2],
      ],
    ],
    [
      [
        [0, 1],
        [2, 2],
        [1, 3],
      ],
    ],
    [
      [
        [0, 1],
        [NaN, 2],
      ],
    ],
  ] as [Rows][])('refuses arguments that do not grow: %j', (rows) => {
    try {
      monotoneCubic(rows);
      expect.unreachable();
    } catch (error) {
      expect(error).toMatchObject({ code: 'bad-table' });
    }
  });

  it('of two rows is a straight line', () => {
    expect(
      value(
        [
          [0, 1],
          [4, 3],
        ],
        1,
      ),
    ).toBe(1.5);
    expect(
      evaluateMonotoneCubic(
        monotoneCubic([
          [0, 1],
          [4, 3],
        ]),
        1,
      ),
    ).toEqual({
      value: 1.5,
      slope: 0.5,
      curvature: 0,
    });
  });

  it('of rows on a straight line is that line', () => {
    const rows: Rows = [
      [0, 0],
      [1, 2],
      [4, 8],
      [5, 10],
    ];
    holds(numbers(0, 5), (x) => {
      expect(value(rows, x)).toBeCloseTo(2 * x, 13);
    });
  });

  it('has slopes by the weighted harmonic mean, by hand', () => {
    // secants 1 and 4 over widths 1 and 2: w₁ = 2·2 + 1 = 5, w₂ = 2 + 2·1 = 4, 9/(5/1 + 4/4) = 1.5
    expect(
      monotoneCubic([
        [0, 0],
        [1, 1],
        [3, 9],
      ]).slopes[1],
    ).toBe(1.5);
  });

  it('has end slopes by the three-point rule, by hand', () => {
    // secants 1 and 2 over widths 1 and 1: (3·1 − 2)/2 = 0.5 at the start, (3·2 − 1)/2 at the end
    const { slopes } = monotoneCubic([
      [0, 0],
      [1, 1],
      [2, 3],
    ]);
    expect(slopes[0]).toBe(0.5);
    expect(slopes[2]).toBe(2.5);
  });

  it('is level at an end where the three-point rule would turn it round', () => {
    expect(
      monotoneCubic([
        [0, 0],
        [1, 1],
        [2, 5],
      ]).slopes[0],
    ).toBe(0);
  });

  it('has three times the secant at an end at most, where the values turn next to it, by hand', () => {
    // secants 1 and −6: the three-point rule gives (3·1 + 6)/2 = 4.5
    expect(
      monotoneCubic([
        [0, 0],
        [1, 1],
        [2, -5],
      ]).slopes[0],
    ).toBe(3);
  });

  it('is level where the values turn', () => {
    expect(
      monotoneCubic([
        [0, 0],
        [1, 2],
        [2, 1],
      ]).slopes[1],
    ).toBe(0);
  });
});

describe('evaluateMonotoneCubic', () => {
  it('passes through every row', () => {
    holds(tables, (rows) => {
      for (const [x, y] of rows) expect(value(rows, x)).toBeCloseTo(y, 12);
    });
  });

  it('passes through the data of Fritsch and Carlson and never falls', () => {
    let before = 0;
    for (const [x, y] of RPN_14) expect(value(RPN_14, x)).toBeCloseTo(y, 14);
    for (let x = 7.99; x <= 20; x += 0.001) {
      const here = value(RPN_14, x);
      // 1e-15: rounding where the curve is level
      expect(here).toBeGreaterThan(before - 1e-15);
      before = here;
    }
  });

  it('never leaves the range of the two rows about it', () => {
    holds(fc.tuple(tables, fc.boolean(), numbers(0, 1)), ([rows, flatEnd, share]) => {
      const cubic = monotoneCubic(rows, flatEnd);
      for (const [k, [x0, y0]] of rows.slice(0, -1).entries()) {
        const [x1, y1] = rows[k + 1] ?? [x0, y0];
        const got = evaluateMonotoneCubic(cubic, x0 + share * (x1 - x0)).value;
        expect(got).toBeGreaterThan(Math.min(y0, y1) - 1e-12);
        expect(got).toBeLessThan(Math.max(y0, y1) + 1e-12);
      }
    });
  });

  it('is monotone between rows', () => {
    holds(fc.tuple(tables, fc.boolean(), numbers(0, 1)), ([rows, flatEnd, share]) => {
      const cubic = monotoneCubic(rows, flatEnd);
      for (const [k, [x0, y0]] of rows.slice(0, -1).entries()) {
        const [x1, y1] = rows[k + 1] ?? [x0, y0];
        const { slope } = evaluateMonotoneCubic(cubic, x0 + share * (x1 - x0));
        // slopes up to 3 · 20 / 0.05, rounded
        expect(slope * Math.sign(y1 - y0)).toBeGreaterThan(-1e-11);
      }
    });
  });

  it('has one slope on either side of a row', () => {
    holds(tables, (rows) => {
      const cubic = monotoneCubic(rows);
      for (const [x] of rows.slice(1, -1)) {
        const [before, after] = [x - 1e-9, x + 1e-9].map(
          (near) => evaluateMonotoneCubic(cubic, near).slope,
        );
        // 2e-9 of a curvature of 6 · 20 / 0.05² at most
        expect(Math.abs((before ?? NaN) - (after ?? NaN))).toBeLessThan(5e-4);
      }
    });
  });

  it('has the slope and curvature of its value', () => {
    const cubic = monotoneCubic(RPN_14);
    const h = 1e-4;
    for (const x of [8.4, 9, 9.6, 11, 13, 17]) {
      const [a, b, c] = [x - h, x, x + h].map((near) => evaluateMonotoneCubic(cubic, near));
      if (a === undefined || b === undefined || c === undefined) throw new Error('three places');
      // a cubic: h²/6 of its third derivative, and 1e-16/h² of rounding
      expect(b.slope).toBeCloseTo((c.value - a.value) / (2 * h), 7);
      expect(b.curvature).toBeCloseTo((c.value - 2 * b.value + a.value) / (h * h), 6);
    }
  });

  it('with a flat end meets its last row level', () => {
    holds(tables, (rows) => {
      const [x, y] = rows.at(-1) ?? [NaN, NaN];
      const end = evaluateMonotoneCubic(monotoneCubic(rows, true), x);
      expect(end.value).toBeCloseTo(y, 12);
      // slopes up to 400, rounded
      expect(Math.abs(end.slope)).toBeLessThan(1e-11);
    });
  });

  it('keeps the nearest row beyond its rows', () => {
    const rows: Rows = [
      [0, 5],
      [1, 3],
      [4, 0],
    ];
    for (const x of [-1e-9, -100]) {
      expect(evaluateMonotoneCubic(monotoneCubic(rows), x)).toEqual({
        value: 5,
        slope: 0,
        curvature: 0,
      });
    }
    for (const x of [4 + 1e-9, 100]) {
      expect(evaluateMonotoneCubic(monotoneCubic(rows), x)).toEqual({
        value: 0,
        slope: 0,
        curvature: 0,
      });
    }
  });

  it('has its own slope on its first and last row, not that beyond', () => {
    const cubic = monotoneCubic([
      [0, 0],
      [1, 1],
      [2, 3],
    ]);
    expect(evaluateMonotoneCubic(cubic, 0).slope).toBe(0.5);
    expect(evaluateMonotoneCubic(cubic, 2).slope).toBeCloseTo(2.5, 14);
  });

  it('moves with its table', () => {
    holds(fc.tuple(tables, numbers(-50, 50), numbers(0, 1)), ([rows, shift, share]) => {
      const [[from] = [0], [to] = [0]] = [rows[0], rows.at(-1)];
      const x = from + share * (to - from);
      const moved = rows.map(([a, b]): [number, number] => [a + shift, b + shift]);
      // slopes up to 1,200 times roundings of 50
      expect(value(moved, x + shift)).toBeCloseTo(value(rows, x) + shift, 9);
    });
  });

  it('turns over with its table', () => {
    holds(fc.tuple(tables, numbers(-2, 20)), ([rows, x]) => {
      const over = rows.map(([a, b]): [number, number] => [a, -b]);
      expect(value(over, x)).toBeCloseTo(-value(rows, x), 12);
    });
  });
});
