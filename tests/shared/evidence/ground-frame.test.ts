import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { groundFrame } from '../../../shared/evidence/ground-frame.ts';
import { cornersOf } from '../../../shared/evidence/marks.ts';
import { boundingBox, boxDistance } from '../../../shared/geometry/bounding-box.ts';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { holds, numbers } from '../../support/property.ts';

const WINDOW = { left: 17, top: 20, right: 307, bottom: 276 };
const MIDDLE = [162, 148] as const;

const turns = numbers(-Math.PI, Math.PI).map((turn): PlanPoint => [Math.cos(turn), Math.sin(turn)]);
const frames = fc
  .record({
    centre: fc.tuple(numbers(-600_000, 600_000), numbers(0, 6_000_000)),
    denominator: numbers(50, 50_000),
    right: turns,
  })
  .map((about) => groundFrame(WINDOW, about));
const spots = fc.tuple(numbers(WINDOW.left, WINDOW.right), numbers(WINDOW.top, WINDOW.bottom));

describe('groundFrame', () => {
  it('draws a wall of 10 m at 1 : 1250 8 mm long', () => {
    holds(fc.tuple(turns, turns), ([right, along]) => {
      const { place } = groundFrame(WINDOW, { centre: [500_000, 5_900_000], denominator: 1250, right }); // prettier-ignore
      const wall: PlanPoint[] = [[500_020, 5_900_030], [500_020 + 10 * along[0], 5_900_030 + 10 * along[1]]]; // prettier-ignore
      const [from = [0, 0], to = [0, 0]] = wall.map(place);
      expect(Math.abs(planDistance(from, to) - 8)).toBeLessThan(0.001);
    });
  });

  it('has its point in the middle, east to the right and north up', () => {
    const { place } = groundFrame(WINDOW, { centre: [1000, 2000], denominator: 500 });
    expect(place([1000, 2000])).toEqual(MIDDLE);
    expect(place([1005, 2000])).toEqual([MIDDLE[0] + 10, MIDDLE[1]]);
    expect(place([1000, 2005])).toEqual([MIDDLE[0], MIDDLE[1] - 10]);
  });

  it('turned, has its own direction to the right and what is left of it up', () => {
    const { place } = groundFrame(WINDOW, { centre: [0, 0], denominator: 500, right: [0, 1] });
    expect(place([0, 5])).toEqual([MIDDLE[0] + 10, MIDDLE[1]]);
    expect(place([-5, 0])).toEqual([MIDDLE[0], MIDDLE[1] - 10]);
  });

  it('finds the ground of a place again', () => {
    holds(fc.tuple(frames, spots), ([frame, spot]) => {
      const point = frame.ground(spot);
      expect(planDistance(frame.place(point), spot)).toBeLessThan(1e-4);
      expect(planDistance(frame.ground(frame.place(point)), point)).toBeLessThan(1e-6);
    });
  });

  it('has a box that holds all of its window and no more', () => {
    holds(fc.tuple(frames, spots), ([frame, spot]) => {
      const { west, south, east, north } = frame.box;
      const point = boundingBox([frame.ground(spot)]);
      expect(boxDistance(point, frame.box)).toBeLessThan(1e-6);
      const corners = cornersOf(WINDOW).map(frame.ground);
      const [eastings, northings] = [corners.map(([e]) => e), corners.map(([, n]) => n)];
      expect([west, east]).toEqual([Math.min(...eastings), Math.max(...eastings)]);
      expect([south, north]).toEqual([Math.min(...northings), Math.max(...northings)]);
    });
  });
});
