import { describe, expect, test } from 'vitest';
import { longSection } from '../../../shared/assessment/long-section.ts';
import {
  sectionsOfDesign,
  type SectionAcross,
} from '../../../shared/assessment/sections-of-design.ts';
import { aDesign } from '../../support/designs.ts';

const RULES = { depth: { kind: 'clay' }, focus: 'axis' } as const;
const LOSSES = { low: 0.01, central: 0.015, high: 0.02 };
const WIDTHS = { low: 0.4, central: 0.5, high: 0.6 };
/** πD²/4 of 6 m. */
const FACE = 28.2743;

/** S of one bore 20 m deep, some way off. */
function trough(volumeLoss: number, k: number, offset: number): number {
  const i = k * 20;
  const largest = (volumeLoss * FACE) / (2.506628 * i);
  return largest * Math.exp(-(offset * offset) / (2 * i * i));
}

function at({ points }: SectionAcross, offset: number) {
  const found = points.find((point) => Math.abs(point.offset - offset) < 1e-9);
  if (found === undefined) throw new Error(`no point at ${offset}`);
  return found.settlement;
}

describe('a section across a designed line', () => {
  test('has the trough of a straight bore, low to high over volume losses and K', () => {
    const design = aDesign({ volumeLoss: LOSSES, troughWidth: WIDTHS });
    const section = sectionsOfDesign(design, RULES)(500, 40);
    expect(section).toMatchObject({ chainage: 500, middle: [0, 0], groundLevel: 0 });
    for (const offset of [-40, 0, 10, 20, 40]) {
      const all = [0.4, 0.45, 0.5, 0.55, 0.6].flatMap((k) =>
        [0.01, 0.015, 0.02].map((loss) => trough(loss, k, offset)),
      );
      const settlement = at(section, offset);
      expect(settlement?.central).toBeCloseTo(trough(0.015, 0.5, offset), 7);
      expect(settlement?.low).toBeCloseTo(Math.min(...all), 7);
      expect(settlement?.high).toBeCloseTo(Math.max(...all), 7);
    }
    // above the axis the narrowest trough is the deepest, far off the widest
    expect(at(section, 0)?.high).toBeCloseTo(trough(0.02, 0.4, 0), 7);
    expect(at(section, 40)?.high).toBeCloseTo(trough(0.02, 0.6, 40), 7);
  });

  test('is fine enough for the narrowest trough and reaches as far as asked', () => {
    const { points } = sectionsOfDesign(aDesign({ troughWidth: WIDTHS }), RULES)(300, 60);
    expect([points[0]?.offset, points.at(-1)?.offset]).toEqual([-60, 60]);
    const [a, b] = [points[0]?.offset ?? NaN, points[1]?.offset ?? NaN];
    expect(b - a).toBeLessThanOrEqual(1);
  });

  test('adds twin bores and tells where they are', () => {
    const bores = { kind: 'twin', spacing: 16, later: 'right', laterFactor: 1.5 } as const;
    const section = sectionsOfDesign(aDesign({ bores }), RULES)(500, 20);
    expect(section.bores).toEqual([
      { name: 'Left drive', offset: 8, axis: -20, diameter: 6 },
      { name: 'Right drive', offset: -8, axis: -20, diameter: 6 },
    ]);
    for (const offset of [-20, 0, 20]) {
      const wanted = trough(0.015, 0.5, offset - 8) + 1.5 * trough(0.015, 0.5, offset + 8);
      expect(at(section, offset)?.central).toBeCloseTo(wanted, 7);
    }
  });

  test('stands square to the part of the line that it is on, and on it', () => {
    const line: [number, number][] = [[0, 0], [100, 0], [100, 80]]; // prettier-ignore
    const levels = [
      { chainage: 0, level: -20 },
      { chainage: 180, level: -29 },
    ];
    const sections = sectionsOfDesign(aDesign({ line, levels }), RULES);
    const [first, second] = [sections(40, 30), sections(120, 30)];
    expect([first.middle, first.left.map((x) => x + 0)]).toEqual([
      [40, 0],
      [0, 1],
    ]);
    expect([second.middle, second.left.map((x) => x + 0)]).toEqual([
      [100, 20],
      [-1, 0],
    ]);
    expect(second.bores[0]?.axis).toBeCloseTo(-26, 12);
    expect([sections(-5, 30).chainage, sections(900, 30).chainage]).toEqual([0, 180]);
  });

  test('has no settlement where the bore comes out of the ground', () => {
    const levels = [
      { chainage: 0, level: -20 },
      { chainage: 500, level: -20 },
      { chainage: 1000, level: 10 },
    ];
    const sections = sectionsOfDesign(aDesign({ levels }), RULES);
    expect(sections(990, 10).points.every(({ settlement }) => settlement === null)).toBe(true);
    expect(at(sections(100, 10), 0)?.central).toBeCloseTo(trough(0.015, 0.5, 0), 5);
  });
});

describe('a long section', () => {
  test('has ground, crown, axis and invert at the ends and where levels are given', () => {
    const levels = [
      { chainage: 100, level: -20 },
      { chainage: 300, level: -30 },
      { chainage: 1500, level: -90 },
    ];
    expect(longSection(aDesign({ levels, groundLevel: 3 }))).toEqual([
      { chainage: 0, ground: 3, crown: -17, axis: -20, invert: -23 },
      { chainage: 100, ground: 3, crown: -17, axis: -20, invert: -23 },
      { chainage: 300, ground: 3, crown: -27, axis: -30, invert: -33 },
      { chainage: 1000, ground: 3, crown: -62, axis: -65, invert: -68 },
    ]);
  });
});
