import { describe, expect, it } from 'vitest';
import { facadeChains } from '../../../shared/building/facade-chains.ts';
import { facadesOf, type BuildingWalls } from '../../../shared/building/facade.ts';
import { joinedBuildings } from '../../../shared/building/joined-buildings.ts';
import { ROW_TOLERANCE } from '../../../shared/building/row-tolerance.ts';
import type { PlanPoint, Segment } from '../../../shared/geometry/point.ts';
import { arcPoints, house, terrace } from '../../support/terraces.ts';

function chains(buildings: readonly BuildingWalls[]) {
  return facadeChains(joinedBuildings(buildings.map(facadesOf), ROW_TOLERANCE), ROW_TOLERANCE);
}

describe('facadeChains', () => {
  it('of houses side by side are their fronts and their backs, open', () => {
    const found = chains([house('a', 0, 0), house('b', 5, 0), house('c', 10, 0)]);
    expect(found).toHaveLength(2);
    for (const { facades, closed } of found) {
      expect(closed).toBe(false);
      expect(facades).toHaveLength(3);
      for (const [k, { end }] of facades.slice(0, -1).entries()) {
        expect(facades[k + 1]?.start).toEqual(end);
      }
    }
  });

  it('read façades in one direction, whichever way they are drawn', () => {
    const [b] = [house('b', 5, 0)].map(({ id, walls }) => ({
      id,
      walls: walls.map(({ start, end }) => ({ start: end, end: start })),
    }));
    if (b === undefined) throw new Error('there is a house');
    for (const { facades } of chains([house('a', 0, 0), b, house('c', 10, 0)])) {
      const [first, second, third] = facades;
      expect(first?.end).toEqual(second?.start);
      expect(second?.end).toEqual(third?.start);
      expect(second?.direction[0]).toBe(first?.direction[0]);
    }
  });

  it('close round a circus', () => {
    const points = arcPoints(72, 60, (5 * Math.PI) / 180);
    const backs = points.map(([x, y]): PlanPoint => [1.2 * x, 1.2 * y]);
    const [first, firstBack] = [points[0], backs[0]];
    if (first === undefined || firstBack === undefined) throw new Error('a circus has houses');
    const found = chains(terrace([...points, first], [...backs, firstBack]));
    expect(found.map(({ facades, closed }) => [facades.length, closed])).toEqual([
      [72, true],
      [72, true],
    ]);
  });

  const party: Segment = { start: [5, 0], end: [5, 8] };

  function frontOfA(buildings: readonly BuildingWalls[]): string[] {
    const front = chains(buildings).find(({ facades }) =>
      facades.some((f) => f.buildingId === 'a' && f.wallIndex === 0),
    );
    return (front?.facades ?? []).map((f) => `${f.buildingId}${f.wallIndex}`).sort();
  }

  it('link the nearest of several ends', () => {
    const far: Segment = { start: [5, 0.4], end: [10, 0.4] };
    const near: Segment = { start: [5, 0.1], end: [10, 0.1] };
    const b = { id: 'b', walls: [party, far, near] };
    expect(frontOfA([house('a', 0, 0), b])).toEqual(['a0', 'b2']);
  });

  it('link the straightest of ends equally near', () => {
    const bent: Segment = { start: [5, 0], end: [10, 0.6] };
    const straight: Segment = { start: [5, 0], end: [10, 0.1] };
    const b = { id: 'b', walls: [party, bent, straight] };
    expect(frontOfA([house('a', 0, 0), b])).toEqual(['a0', 'b2']);
  });

  it('hold no façade twice', () => {
    const town = [0, 1, 2, 3].flatMap((row) =>
      [0, 1, 2, 3].map((column) => house(`${row}${column}`, 5 * column, 8 * row)),
    );
    const all = chains(town).flatMap(({ facades }) =>
      facades.map(({ buildingId, wallIndex }) => `${buildingId} ${wallIndex}`),
    );
    expect(new Set(all).size).toBe(all.length);
  });
});
