import { describe, expect, it } from 'vitest';
import { createMapController } from '../../../../../src/features/map/controller/map-controller.ts';
import { mapPlan, tileSet } from '../../../../support/map-plans.ts';
import { notingMap } from '../../../../support/noting-map.ts';

function ofMeant(told: readonly string[]): string[] {
  return told.filter((words) => words.startsWith('mark buildings'));
}

describe('buildings that are meant', () => {
  const buildings = tileSet();

  it('are told to the map as they come and go', () => {
    const { map, told } = notingMap();
    const controller = createMapController(map);
    controller.show(mapPlan({ buildings, meant: new Set([1, 2]) }));
    expect(ofMeant(told())).toEqual([
      'mark buildings 1 {"meant":true}',
      'mark buildings 2 {"meant":true}',
    ]);
    controller.show(mapPlan({ buildings, meant: new Set([2, 3]) }));
    expect(ofMeant(told())).toEqual([
      'mark buildings 1 {"meant":false}',
      'mark buildings 3 {"meant":true}',
    ]);
    controller.show(mapPlan({ buildings }));
    expect(ofMeant(told())).toHaveLength(2);
  });

  it('are told again when their source is another', () => {
    const { map, told } = notingMap();
    const controller = createMapController(map);
    const meant = new Set([1]);
    controller.show(mapPlan({ buildings, meant }));
    told();
    controller.show(mapPlan({ buildings: tileSet({ maxzoom: 15 }), meant }));
    expect(ofMeant(told())).toEqual(['mark buildings 1 {"meant":true}']);
  });

  it('leave the others faint', () => {
    const { map, told } = notingMap();
    const controller = createMapController(map);
    controller.show(mapPlan({ buildings }));
    told();
    controller.show(mapPlan({ buildings, meant: new Set() }));
    expect(told().filter((words) => words.startsWith('paint buildings fill-opacity'))).toHaveLength(
      1,
    );
  });
});
