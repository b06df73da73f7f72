import { expect, test } from 'vitest';
import { boundingBox } from '../../../shared/geometry/bounding-box.ts';
import { overlapArea } from '../../../server/imports/overlap-area.ts';
import { rectangle } from '../../support/import-files.ts';

type Ring = ReturnType<typeof rectangle>;

function outlined(...rings: Ring[]) {
  return { box: boundingBox(rings.flat()), rings: [rings] };
}

function turned(ring: Ring): Ring {
  return ring.map(([x, y]) => [0.8 * x - 0.6 * y, 0.6 * x + 0.8 * y]);
}

const HOUSE = rectangle(0, 0);

test.each<[string, Ring, number]>([
  ['crosses it', rectangle(5, 4), 20],
  ['stands in line with it and reaches into it', rectangle(6, 0), 32],
  ['lies in it', rectangle(2, 2, 3, 3), 9],
  ['lies round it', rectangle(-5, -5, 40, 40), 80],
  ['shares a wall', rectangle(10, 0), 0],
  ['shares a part of a wall', rectangle(10, 3, 4, 20), 0],
  ['reaches over a shared wall by a hand', rectangle(9.96, 0), 0],
  ['overlaps by less than a square metre', rectangle(9.5, 7, 5, 5), 0],
])('a footprint that %s', (_, other, area) => {
  for (const [one, two] of [
    [HOUSE, other],
    [turned(HOUSE), turned(other)],
    [[...HOUSE].reverse(), other],
  ] as const) {
    // prettier-ignore
    expect(overlapArea(outlined([...one]), outlined([...two]))).toBeCloseTo(area, 6);
    expect(overlapArea(outlined([...two]), outlined([...one]))).toBeCloseTo(area, 6);
  }
});
