import { describe, expect, test } from 'vitest';
import { wallsOfFootprint } from '../../../shared/building/walls-of-footprint.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';

/** A house whose long side was drawn in three strokes, with a jog of 6 cm. */
const RING: PlanPoint[] = [
  [0, 0],
  [6, 0],
  [6, 0.06],
  [12, 0.06],
  [18, 0.1],
  [18, 9],
  [0, 9],
];

describe('the walls of a footprint', () => {
  test('are its edges, nearly collinear ones merged and jogs passed over', () => {
    const walls = wallsOfFootprint([RING]);
    expect(walls).toHaveLength(4);
    expect(walls[0]).toEqual({ start: [0, 0], end: [18, 0.1] });
  });

  test('those of a courtyard are walls too', () => {
    const courtyard: PlanPoint[] = [
      [6, 3],
      [6, 6],
      [10, 6],
      [10, 3],
    ];
    expect(wallsOfFootprint([RING, courtyard])).toHaveLength(8);
  });

  test('the tolerance is the caller’s to set', () => {
    expect(wallsOfFootprint([RING], { angle: 0.001, offset: 0.001 })).toHaveLength(7);
  });
});
