import { describe, expect, it } from 'vitest';
import { aDrive } from '../support/builders.ts';
import { integral } from '../support/gauss-legendre.ts';
import { deviate, movementAt, sinksOf, type SinkGround } from '../support/point-sinks.ts';
import { sinksOfDrive } from '../support/sinks-of-drive.ts';

const CLAY: SinkGround = { rule: 'clay', focus: 'axis', levels: { ground: 0, founding: 0 } };

/** V_s/(√(2π) i) of the drive of `aDrive`, i = 10 m. */
const S_MAX = (0.015 * Math.PI * 9) / (Math.sqrt(2 * Math.PI) * 10);

/** The share of S_MAX over the axis with a face at easting 0. */
function shareAt(E: number): number {
  const drive = sinksOfDrive(aDrive(), { face: 500 });
  return movementAt(sinksOf([drive], CLAY, [E, 0], 0), E, 0).S / S_MAX;
}

describe('the quadrature by which the kernel is checked', () => {
  it.each([0, 5, 10, 17.3, 30])('gives the error curve %d m from a long straight drive', (y) => {
    const sinks = sinksOf([sinksOfDrive(aDrive())], CLAY, [0, 0], 40);
    const { S, slope, curvature, u, strain } = movementAt(sinks, 0, y);
    const wanted = S_MAX * Math.exp((-y * y) / 200);
    // five points on half a width leave 2e-13; a decade for second derivatives
    const digits = 2e-12 * S_MAX;
    expect(Math.abs(S - wanted)).toBeLessThan(digits);
    expect(Math.abs(slope[1] + (y / 100) * wanted)).toBeLessThan(digits / 10);
    expect(Math.abs(curvature[2] - (y * y - 100) * 1e-4 * wanted)).toBeLessThan(digits / 100);
    // i²/f is 5 m
    expect(Math.abs(u[1] + (y / 20) * wanted)).toBeLessThan(digits / 2);
    expect(Math.abs(strain[2] - (y * y - 100) * 5e-4 * wanted)).toBeLessThan(digits / 20);
  });

  it('gives half the settlement over an open face', () => {
    expect(shareAt(0)).toBeCloseTo(0.5, 12);
  });

  it('gives 27.5 % where tables of Φ have it', () => {
    // −0.59776, to its five digits
    expect(deviate(0.275)).toBeCloseTo(-0.59776, 5);
    expect(shareAt(5.9776)).toBeCloseTo(0.275, 5);
  });

  it('integrates a polynomial of degree 9 exactly', () => {
    expect(integral((x) => 10 * x ** 9, 0, 1, 2)).toBeCloseTo(1, 14);
  });
});
