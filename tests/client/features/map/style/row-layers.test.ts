// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { ROW_OUTCOMES } from '../../../../../shared/schemas/imports.ts';
import { createMapController } from '../../../../../src/features/map/controller/map-controller.ts';
import { addHatches, hatchImage } from '../../../../../src/features/map/style/hatch-images.ts';
import { layersOfPlan } from '../../../../../src/features/map/style/layers-of-plan.ts';
import { faintLayers, rowLayers } from '../../../../../src/features/map/style/row-layers.ts';
import { ROW_LOOKS } from '../../../../../src/features/map/style/row-looks.ts';
import { DAMAGE } from '../../../../../shared/presentation/damage-style.ts';
import { mapPlan, tileSet } from '../../../../support/map-plans.ts';
import { notingMap } from '../../../../support/noting-map.ts';

const PLAN = mapPlan({ buildings: tileSet(), rows: tileSet() });

describe('the looks of rows', () => {
  it('are there for every outcome, each with an edge of its own and no colour of damage', () => {
    expect(Object.keys(ROW_LOOKS).toSorted()).toEqual(ROW_OUTCOMES.toSorted());
    const edges = Object.values(ROW_LOOKS).map((look) => JSON.stringify([look.edge, look.width]));
    expect(new Set(edges).size).toBe(ROW_OUTCOMES.length);
    const fills = Object.values(ROW_LOOKS).map(({ fill }) => fill.toLowerCase());
    const damage = Object.values(DAMAGE).map(({ fill }) => fill.toLowerCase());
    expect(fills.filter((fill) => damage.includes(fill))).toEqual([]);
  });

  it('are drawn by layers of their own, what waits for an answer on top', () => {
    const ids = rowLayers().map(({ id }) => id);
    expect(ids.filter((id) => id.startsWith('row-edge-')).at(-1)).toBe('row-edge-conflict');
    expect(ids.filter((id) => id.startsWith('row-hatch-'))).toHaveLength(2);
  });
});

describe('a plan with rows', () => {
  it('keeps the buildings faint and without names', () => {
    const ids = layersOfPlan(PLAN).map(({ id }) => id);
    expect(ids).not.toContain('building-names');
    expect(ids.indexOf('rows')).toBeGreaterThan(ids.indexOf('building-marks'));
    const line = faintLayers(rowLayers()).find(({ type }) => type === 'line');
    expect(line?.paint).toMatchObject({ 'line-opacity': 0.5 });
  });

  it('marks rows and no buildings', () => {
    const { map, told } = notingMap();
    const controller = createMapController(map);
    controller.show(PLAN);
    told();
    controller.mark({ selected: 7, hovered: null });
    expect(told()).toEqual(['mark rows 7 {"selected":true}']);
  });
});

describe('a hatch', () => {
  it('runs on from tile to tile', () => {
    const { width, height, data } = hatchImage('strokes', '#102030');
    expect(data).toHaveLength(width * height * 4);
    expect([...data.slice(0, 4)]).toEqual([16, 32, 48, 255]);
    const inked = (hatch: 'strokes' | 'crossed') =>
      hatchImage(hatch, '#102030').data.filter((value) => value === 255).length;
    expect(inked('crossed')).toBeGreaterThan(inked('strokes'));
  });

  it('is given to the map by the name that layers ask for', () => {
    const names: string[] = [];
    addHatches({ addImage: (name) => names.push(name) });
    const asked = rowLayers().flatMap(({ type, paint }) =>
      type === 'fill' && paint !== undefined && 'fill-pattern' in paint
        ? [paint['fill-pattern']]
        : [],
    );
    expect(names.toSorted()).toEqual(asked.toSorted());
  });
});
