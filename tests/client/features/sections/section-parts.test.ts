import { describe, expect, it, vi } from 'vitest';
import { longSection } from '../../../../shared/assessment/long-section.ts';
import type { BuildingOutline } from '../../../../shared/schemas/building-outlines.ts';
import { acrossLayout } from '../../../../src/features/sections/across-layout.ts';
import { alongLayout } from '../../../../src/features/sections/along-layout.ts';
import { chainageOfText } from '../../../../src/features/sections/chainage-of-text.ts';
import { cutBuildings } from '../../../../src/features/sections/cut-buildings.ts';
import { reachOfDesign } from '../../../../src/features/sections/reach-of-design.ts';
import { sectionMark } from '../../../../src/features/sections/section-mark.ts';
import { createSectionStore } from '../../../../src/features/sections/section-store.ts';
import { squaresUnder } from '../../../../src/features/sections/squares-under.ts';
import { aDesign } from '../../../support/designs.ts';

describe('a chainage that is written', () => {
  it.each([
    ['2+645', 2645],
    [' 0+030.5 ', 30.5],
    ['1+200,25', 1200.25],
    ['1234.5', 1234.5],
    ['2+64', null],
    ['-3', null],
    ['west', null],
    ['', null],
  ])('%s', (text, metres) => {
    expect(chainageOfText(text)).toBe(metres);
  });
});

describe('squares under a section', () => {
  const diagonal = [Math.SQRT1_2, Math.SQRT1_2] as const;

  it('are all that it runs through, each once', () => {
    expect(squaresUnder({ start: [-50, 10], direction: [1, 0], length: 300 })).toEqual([
      { west: -200, south: 0, east: 0, north: 200 },
      { west: 0, south: 0, east: 200, north: 200 },
      { west: 200, south: 0, east: 400, north: 200 },
    ]);
    const corners = squaresUnder({ start: [190, 5], direction: diagonal, length: 400 });
    expect(corners.map(({ west, south }) => [west, south])).toEqual([
      [0, 0],
      [200, 0],
      [200, 200],
      [400, 200],
    ]);
    expect(squaresUnder({ start: [0, 0], direction: diagonal, length: 200 })).toHaveLength(1);
  });
});

describe('buildings on a section', () => {
  const ring = [[-5, 10], [5, 10], [5, 22], [-5, 22], [-5, 10]] as const; // prettier-ignore
  const outline: BuildingOutline = {
    id: 7,
    reference: 'B-0007',
    name: null,
    storeys: null,
    eavesHeight: 9,
    footprint: [[ring.map(([e, n]) => [e, n])]],
  };
  const section = { middle: [0, 0], left: [0, 1] } as const;

  it('stand where it cuts them, once however often they were fetched', () => {
    expect(cutBuildings(section, 50, [outline, outline])).toEqual([
      { id: 7, reference: 'B-0007', name: null, from: 10, to: 22, eavesHeight: 9, isHeightAssumed: false },
    ]); // prettier-ignore
    expect(cutBuildings({ ...section, middle: [6, 0] }, 50, [outline])).toEqual([]);
    expect(cutBuildings(section, 15, [outline])[0]?.to).toBe(15);
    expect(cutBuildings({ ...section, left: [0, -1] }, 50, [outline])[0]?.from).toBe(-22);
  });

  it('take a height from their storeys, or the usual one, where none is known, and say so', () => {
    const [three] = cutBuildings(section, 50, [{ ...outline, eavesHeight: null, storeys: 3 }]);
    expect(three).toMatchObject({ eavesHeight: 9, isHeightAssumed: true });
    const [unknown] = cutBuildings(section, 50, [{ ...outline, eavesHeight: null }]);
    expect(unknown).toMatchObject({ eavesHeight: 6, isHeightAssumed: true });
  });
});

describe('a drawing across the line', () => {
  const twin = { kind: 'twin', spacing: 16, later: 'left', laterFactor: 1 } as const;

  it('has one scale for widths and levels, with the left at the left, and holds bores and trough', () => {
    const design = aDesign({ bores: twin, troughWidth: { low: 0.4, central: 0.5, high: 0.6 } });
    expect(reachOfDesign(design)).toBe(40);
    const { x, y, pixelsPerMetre, frame, halfWidth, ground } = acrossLayout(design, 900, 200);
    expect(x(0) - x(10)).toBeCloseTo(10 * pixelsPerMetre, 9);
    expect(y(0) - y(10)).toBeCloseTo(10 * pixelsPerMetre, 9);
    expect(y(0)).toBeCloseTo(ground, 9);
    expect(y(-23)).toBeLessThan(frame.bottom);
    expect(y(12)).toBeGreaterThan(frame.top);
    expect(x(halfWidth)).toBeCloseTo(frame.left, 9);
    expect(halfWidth).toBeGreaterThanOrEqual(40);
  });

  it('holds the reach of the trough on a narrow screen too', () => {
    expect(acrossLayout(aDesign(), 330, 400).halfWidth).toBeGreaterThanOrEqual(30);
  });
});

describe('a drawing along the line', () => {
  const rows = longSection(aDesign());

  it('draws levels so many whole times as high as long, and chainage both ways', () => {
    const layout = alongLayout(rows, 20, 900, 220);
    const { x, chainageAt, levels, settlement, factor } = layout;
    const perMetre = (x(1000) - x(0)) / 1000;
    expect(factor).toBeGreaterThan(1);
    expect(levels.y(0) - levels.y(1)).toBeCloseTo(factor * perMetre, 9);
    expect(chainageAt(x(333))).toBeCloseTo(333, 9);
    expect(settlement.y(0)).toBe(settlement.top);
    expect(settlement.y(20)).toBeLessThan(settlement.bottom);
    expect(settlement.top).toBeGreaterThan(levels.bottom);
  });

  it('is as high as long where the line is short', () => {
    const short = longSection(aDesign({ line: [[0, 0], [10, 0]] })); // prettier-ignore
    const { factor, x, levels } = alongLayout(short, 20, 900, 220);
    expect(factor).toBe(1);
    expect(x(10) - x(0)).toBeCloseTo(levels.y(0) - levels.y(10), 9);
  });
});

describe('the mark of a section', () => {
  it('crosses the line as far as the section reaches, and is named', () => {
    const [mark, ...rest] = sectionMark(aDesign(), 250, 40);
    expect(mark).toMatchObject({ kind: 'mark' });
    expect(mark?.kind === 'mark' && mark.places).toEqual([
      [-250, 40],
      [-250, -40],
    ]);
    expect(rest.at(-1)).toEqual({ kind: 'name', place: [-250, -40], text: 'Section 0+250' });
    expect(sectionMark({ line: [[0, 0], [0, 0]] }, 0, 40)).toEqual([]); // prettier-ignore
  });
});

describe('where a line is cut', () => {
  it('is told to who listens, when it changes', () => {
    const store = createSectionStore();
    const listen = vi.fn();
    const stop = store.subscribe(listen);
    expect(store.get()).toBeNull();
    store.set(5);
    store.set(5);
    expect([store.get(), listen.mock.calls.length]).toEqual([5, 1]);
    stop();
    store.set(6);
    expect(listen).toHaveBeenCalledTimes(1);
  });
});
