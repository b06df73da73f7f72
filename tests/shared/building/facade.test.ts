import { describe, expect, it } from 'vitest';
import {
  compareMembers,
  facadesOf,
  reversedFacade,
  type RowMember,
} from '../../../shared/building/facade.ts';
import { house } from '../../support/terraces.ts';

describe('facadesOf', () => {
  it('are the walls with their place, length and direction', () => {
    const [front, side] = facadesOf(house('a', 0, 0));
    expect(front).toEqual({
      buildingId: 'a',
      wallIndex: 0,
      start: [0, 0],
      end: [5, 0],
      length: 5,
      direction: [1, 0],
    });
    expect(side).toMatchObject({ wallIndex: 1, length: 8, direction: [0, 1] });
  });

  it('leave out walls of no length', () => {
    const walls = [
      { start: [1, 1], end: [1, 1] },
      { start: [0, 0], end: [3, 4] },
    ] as const;
    expect(facadesOf({ id: 'a', walls }).map(({ wallIndex }) => wallIndex)).toEqual([1]);
  });
});

describe('reversedFacade', () => {
  it('is read from its other end, and back again', () => {
    const [front] = facadesOf(house('a', 0, 0));
    if (front === undefined) throw new Error('a house has walls');
    const back = reversedFacade(front);
    expect(back).toMatchObject({ start: [5, 0], end: [0, 0], length: 5, wallIndex: 0 });
    expect(back.direction[0]).toBe(-1);
    expect(reversedFacade(back)).toEqual(front);
  });
});

describe('compareMembers', () => {
  it('goes by building, then by wall, by code units and not by language', () => {
    const members: RowMember[] = [
      { buildingId: 'b', wallIndex: 0 },
      { buildingId: 'a', wallIndex: 10 },
      { buildingId: 'é', wallIndex: 0 },
      { buildingId: 'B', wallIndex: 0 },
      { buildingId: 'a', wallIndex: 9 },
    ];
    const order = members.sort(compareMembers);
    expect(order.map(({ buildingId, wallIndex }) => `${buildingId}${wallIndex}`)).toEqual([
      'B0',
      'a9',
      'a10',
      'b0',
      'é0',
    ]);
  });
});
