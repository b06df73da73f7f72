import { describe, expect, it } from 'vitest';
import { FIELD, FIELD_SIZE, sumPieces } from '../../../shared/ground/kernel.ts';

describe('sumPieces', () => {
  function along(count: number, E: number, N: number): number[] {
    const into = new Float64Array(FIELD_SIZE).fill(NaN);
    // i = 2 m, 10 m long, east, V_s/i = 1, i²/f = 0.5
    sumPieces(Float64Array.of(0, 0, 1, 0, 0.5, 5, 1, 0.5), count, E, N, into);
    return [...into];
  }

  it('is nothing without pieces', () => {
    expect(along(0, 5, 0)).toEqual(new Array<number>(FIELD_SIZE).fill(0));
  });

  it.each([
    [-17.01, 0],
    [27.01, 0],
    [5, 16.5],
    [5, -16.5],
  ])('is nothing at (%d, %d): 8.5 widths beyond an end, 8.2 across', (E, N) => {
    expect(along(1, E, N)).toEqual(new Array<number>(FIELD_SIZE).fill(0));
  });

  it('is the closed form over the end of a piece', () => {
    const [S, east, north] = along(1, 10, 1);
    // g = φ(½), Φ(5) − Φ(0), φ(5) − φ(0)
    const g = Math.exp(-1 / 8) / Math.sqrt(2 * Math.PI);
    // the table is good to 1e-11
    expect(S).toBeCloseTo(g * 0.499999713348428, 10);
    expect(east).toBeCloseTo((g * (1.4867195e-6 - 0.3989422804014327)) / 2, 10);
    expect(north).toBeCloseTo((-1 / 4) * g * 0.499999713348428, 10);
  });

  it('moves the ground by i²/f of its slope', () => {
    const values = along(1, 7, 1.5);
    expect(values[FIELD.displacementEast]).toBe(0.5 * (values[FIELD.slopeEast] ?? NaN));
    expect(values[FIELD.strainEastNorth]).toBe(0.5 * (values[FIELD.curvatureEastNorth] ?? NaN));
  });

  it('gives finite numbers everywhere', () => {
    for (let E = -18; E < 28; E += 0.37) {
      for (let N = -17; N < 17; N += 0.61) {
        expect(along(1, E, N).every(Number.isFinite)).toBe(true);
      }
    }
  });
});
