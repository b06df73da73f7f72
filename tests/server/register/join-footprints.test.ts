import { describe, expect, test } from 'vitest';
import { footprintArea } from '../../../shared/building/footprint-area.ts';
import type { FootprintRings } from '../../../server/models/building-footprint.ts';
import { joinFootprints } from '../../../server/register/join-footprints.ts';
import { box, E, N } from '../../support/register.ts';

function turned(footprint: FootprintRings, degrees: number): FootprintRings {
  const [cos, sin] = [Math.cos, Math.sin].map((of) => of((degrees * Math.PI) / 180));
  return footprint.map((part) =>
    part.map((ring) =>
      ring.map(([x, y]) => {
        const [dx, dy] = [x - E, y - N];
        return [E + dx * (cos ?? 0) - dy * (sin ?? 0), N + dx * (sin ?? 0) + dy * (cos ?? 0)];
      }),
    ),
  );
}

/** Houses 10 m wide, of different depths, with such gaps between them; less than nothing reaches over. */
function terrace(...gaps: number[]): FootprintRings[] {
  let east = 0;
  return [0, ...gaps].map((gap, k) => {
    east += gap + (k === 0 ? 0 : 10);
    return box(east, k % 3, 10, 8 + (k % 2));
  });
}

describe.each([0, 33])('joining houses that stand %s° to the grid', (degrees) => {
  const join = (houses: readonly FootprintRings[]) =>
    joinFootprints(houses.map((house) => turned(house, degrees)));

  test.each([
    ['wall to wall', [0, 0]],
    ['a centimetre apart', [0.01, 0.01]],
    ['five centimetres apart', [0.0499, 0.0499]],
    ['three centimetres over each other', [-0.03, -0.03]],
    ['here so and there so', [0.02, -0.02, 0, 0.049]],
  ])('makes one of those %s, without slits', (_, gaps) => {
    const houses = terrace(...gaps);
    const one = join(houses);
    expect(one.map((part) => part.length)).toEqual([1]);
    const most = gaps.reduce((sum, gap) => sum + Math.abs(gap) * 10, 1e-6);
    const off = footprintArea(one) - houses.reduce((sum, house) => sum + footprintArea(house), 0);
    expect(Math.abs(off)).toBeLessThanOrEqual(most);
  });

  test('makes one of those whose walls are askew', () => {
    const [a, b] = [box(0, 0), [[[[E + 10.04, N], [E + 20, N], [E + 20, N + 10], [E + 10.01, N + 10]]]]] as const; // prettier-ignore
    const one = join([a, b]);
    expect(one.map((part) => part.length)).toEqual([1]);
    expect(footprintArea(one)).toBeCloseTo(200, 3);
  });

  test('fits one in between two', () => {
    const one = join([box(0, 0), box(20.06, 0), box(10.03, 0)]);
    expect(one.map((part) => part.length)).toEqual([1]);
    expect(footprintArea(one)).toBeCloseTo(300.6, 0);
  });

  test('keeps a courtyard that they stand round', () => {
    const one = join([
      ...[box(0, 0, 30, 10), box(0, 20.02, 30, 10)],
      ...[box(0, 10.01, 10, 10), box(20, 10.01, 10, 10)],
    ]);
    expect(one.map((part) => part.length)).toEqual([2]);
    expect(footprintArea(one)).toBeCloseTo(800, 0);
  });

  test.each([0.06, 1])('refuses those %s m apart', (gap) => {
    expect(() => join(terrace(gap))).toThrow(/at most 5 cm apart/);
    expect(() => join(terrace(0, gap))).toThrow(/at most 5 cm apart/);
  });

  test('refuses those that only meet at a corner', () => {
    expect(() => join([box(0, 0), box(10, 10)])).toThrow(/do not touch/);
  });
});
