import { describe, expect, it } from 'vitest';
import { facadesOf, type BuildingWalls } from '../../../shared/building/facade.ts';
import { isSharedWall } from '../../../shared/building/is-shared-wall.ts';
import { joinedBuildings } from '../../../shared/building/joined-buildings.ts';
import { ROW_TOLERANCE } from '../../../shared/building/row-tolerance.ts';
import fc from 'fast-check';
import { holds, numbers } from '../../support/property.ts';
import { house, houseName } from '../../support/terraces.ts';

function pairs(buildings: readonly BuildingWalls[]): string[] {
  return joinedBuildings(buildings.map(facadesOf), ROW_TOLERANCE).map(
    ([a, b]) => `${a[0]?.buildingId ?? ''} ${b[0]?.buildingId ?? ''}`,
  );
}

describe('joinedBuildings', () => {
  it('of none are none', () => {
    expect(pairs([])).toEqual([]);
    expect(pairs([house('a', 0, 0)])).toEqual([]);
  });

  it('share a party wall', () => {
    expect(pairs([house('a', 0, 0), house('b', 5, 0), house('c', 10, 0)])).toEqual(['a b', 'b c']);
  });

  it('may stand 0.4 m apart, not 0.6', () => {
    expect(pairs([house('a', 0, 0), house('b', 5.4, 0)])).toEqual(['a b']);
    expect(pairs([house('a', 0, 0), house('b', 5.6, 0)])).toEqual([]);
  });

  it('may be back to back', () => {
    expect(pairs([house('a', 0, 0), house('b', 2, 8)])).toEqual(['a b']);
  });

  it('do not share a wall at a corner', () => {
    expect(pairs([house('a', 0, 0), house('b', 5, 8)])).toEqual([]);
    expect(pairs([house('a', 0, 0), house('b', 5, 7.6)])).toEqual([]);
  });

  it('agree with a search through all pairs', () => {
    const places = fc.array(fc.tuple(numbers(0, 40), numbers(0, 40), numbers(4, 12)), {
      maxLength: 20,
    });
    holds(places, (drawn) => {
      const buildings = drawn.map(([x, y, width], k) =>
        house(houseName(k), Math.round(x / 4) * 4, Math.round(y / 8) * 8, Math.round(width)),
      );
      const facades = buildings.map(facadesOf);
      const wanted = facades.flatMap((one, a) =>
        facades.slice(a + 1).flatMap((other, gap) => {
          const joined = one.some((p) => other.some((q) => isSharedWall(p, q, ROW_TOLERANCE)));
          return joined ? [`${houseName(a)} ${houseName(a + 1 + gap)}`] : [];
        }),
      );
      expect(pairs(buildings)).toEqual(wanted);
    });
  });
});
