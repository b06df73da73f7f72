// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { createMapController } from '../../../../../src/features/map/controller/map-controller.ts';
import { mapPlan, tileSet } from '../../../../support/map-plans.ts';
import { notingMap } from '../../../../support/noting-map.ts';

const BUILDINGS = tileSet();

function shown(shades: ReadonlyMap<number, number> | undefined, buildings = BUILDINGS) {
  return mapPlan({ buildings, ...(shades !== undefined && { shades }) });
}

/** Beside the tile's shapes, what is written on them is told the same. */
function ofShapes(told: readonly string[]): string[] {
  return told.filter((words) => words.startsWith('mark buildings'));
}

describe('buildings in colours', () => {
  const first = new Map([[1, 0], [2, 3]]); // prettier-ignore

  it('are told only of those that take another', () => {
    const { map, told } = notingMap();
    const controller = createMapController(map);
    controller.show(shown(first));
    expect(ofShapes(told())).toEqual([
      'mark buildings 1 {"shade":0}',
      'mark buildings 2 {"shade":3}',
    ]);
    controller.show(shown(new Map([[2, 4], [3, 1]]))); // prettier-ignore
    const notes = told();
    expect(ofShapes(notes)).toEqual([
      'mark buildings 1 {"shade":null}',
      'mark buildings 2 {"shade":4}',
      'mark buildings 3 {"shade":1}',
    ]);
    // nothing has to be fetched or laid out again
    expect(notes.filter((note) => !note.startsWith('mark'))).toEqual([]);
  });

  it('keep them while nobody asks, and are told again when their source is another', () => {
    const { map, told } = notingMap();
    const controller = createMapController(map);
    controller.show(shown(first));
    controller.show(shown(undefined));
    told();
    controller.show(shown(new Map(first)));
    expect(ofShapes(told())).toEqual([]);
    controller.show(shown(first, tileSet({ maxzoom: 15 })));
    expect(ofShapes(told())).toHaveLength(2);
  });
});
