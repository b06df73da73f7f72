// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { createMapController } from '../../../../../src/features/map/controller/map-controller.ts';
import { NO_MARKS } from '../../../../../src/features/map/map-plan.ts';
import { MAP_COLOURS } from '../../../../../src/features/map/style/map-colours.ts';
import { mapPlan, tileSet } from '../../../../support/map-plans.ts';
import { notingMap } from '../../../../support/noting-map.ts';

const DEMO = mapPlan({ basemap: tileSet(), buildings: tileSet() });

function controlled() {
  const { map, told } = notingMap();
  return { controller: createMapController(map), told };
}

describe('showing a plan', () => {
  it('adds sources before the layers that draw from them', () => {
    const { controller, told } = controlled();
    controller.show(DEMO);
    const notes = told();
    expect(notes.slice(0, 3)).toEqual([
      'add source basemap',
      'add source buildings',
      'add source grid',
    ]);
    expect(notes).toContain('add layer buildings');
  });

  it('does nothing for the same plan again', () => {
    const { controller, told } = controlled();
    controller.show(DEMO);
    told();
    controller.show(structuredClone(DEMO));
    expect(told()).toEqual([]);
  });

  it('changes one address when the register has grown', () => {
    const { controller, told } = controlled();
    controller.show(DEMO);
    told();
    controller.show({ ...DEMO, buildings: tileSet({ url: '2' }) });
    expect(told()).toEqual(['set tiles buildings ["2"]']);
  });

  it('takes layers away before their source, and the sea with the town', () => {
    const { controller, told } = controlled();
    controller.show(DEMO);
    told();
    controller.show({ ...DEMO, basemap: null });
    const notes = told();
    expect(notes.at(-2)).toBe('remove source basemap');
    expect(notes.at(-1)).toBe(`paint paper background-color ${MAP_COLOURS.land}`);
    expect(notes.filter((note) => note.includes('building'))).toEqual([]);
  });
});

describe('marking buildings', () => {
  /** A building is drawn in one layer of its tile and written on in another. */
  function marks(id: number, state: string): string[] {
    return [`mark buildings ${id} ${state}`, `mark labels ${id} ${state}`];
  }

  it('takes the mark from one and gives it to another', () => {
    const { controller, told } = controlled();
    controller.show(DEMO);
    controller.mark({ selected: 4, hovered: null });
    told();
    controller.mark({ selected: 7, hovered: 5 });
    expect(told()).toEqual([
      ...marks(4, '{"selected":false}'),
      ...marks(7, '{"selected":true}'),
      ...marks(5, '{"hovered":true}'),
    ]);
    controller.mark({ selected: 7, hovered: null });
    expect(told()).toEqual(marks(5, '{"hovered":false}'));
  });

  it('waits for buildings, and marks them when they come', () => {
    const { controller, told } = controlled();
    controller.show(mapPlan());
    controller.mark({ selected: 4, hovered: null });
    told();
    controller.show(DEMO);
    expect(told().slice(-2)).toEqual(marks(4, '{"selected":true}'));
    controller.mark(NO_MARKS);
    expect(told()).toEqual(marks(4, '{"selected":false}'));
  });
});
