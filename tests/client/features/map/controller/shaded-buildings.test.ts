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

  it('are told first of those that are seen, and of the others frame by frame', () => {
    const { map, told, drawFrame } = notingMap(new Set([7, 11_000]));
    const controller = createMapController(map);
    const town = (shade: number) => new Map(Array.from({ length: 25_000 }, (_, id) => [id, shade]));
    controller.show(shown(town(1)));
    expect(ofShapes(told())).toEqual([
      'mark buildings 7 {"shade":1}',
      'mark buildings 11000 {"shade":1}',
    ]);
    drawFrame();
    expect(ofShapes(told())).toHaveLength(10_000);
    // other colours before all have heard of the first: nobody is told what is no longer so
    controller.show(shown(town(2)));
    expect(ofShapes(told())).toHaveLength(2);
    const later: string[] = [];
    for (let frame = 0; frame < 4; frame += 1) {
      drawFrame();
      later.push(...ofShapes(told()));
    }
    expect(later).toHaveLength(24_998);
    expect(later.every((words) => words.endsWith('{"shade":2}'))).toBe(true);
  });

  it('are all told at once where they are seen from far, and what is written on them after it', () => {
    const { map, told, drawFrame } = notingMap();
    createMapController(map).show(
      shown(new Map(Array.from({ length: 12_000 }, (_, id) => [id, 1]))),
    );
    const shapes = told().filter((words) => words.startsWith('mark'));
    expect(shapes).toHaveLength(12_000);
    expect(ofShapes(shapes)).toHaveLength(12_000);
    drawFrame();
    const labels = told();
    expect(labels).toHaveLength(10_000);
    expect(ofShapes(labels)).toEqual([]);
    drawFrame();
    expect(told()).toHaveLength(2_000);
    drawFrame();
    expect(told()).toEqual([]);
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
