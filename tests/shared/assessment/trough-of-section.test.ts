import { describe, expect, it } from 'vitest';
import { sectionsOfDesign } from '../../../shared/assessment/sections-of-design.ts';
import { settlementAlong } from '../../../shared/assessment/settlement-along.ts';
import { troughOfSection } from '../../../shared/assessment/trough-of-section.ts';
import { aDesign } from '../../support/designs.ts';

const RULES = { depth: { kind: 'clay' }, focus: 'axis' } as const;
const LOSSES = { low: 0.01, central: 0.015, high: 0.02 };
/** πD²/4 of 6 m. */
const FACE = 28.2743339;
const OUT_OF_THE_GROUND = [
  { chainage: 0, level: -20 },
  { chainage: 500, level: -20 },
  { chainage: 1000, level: 10 },
];

describe('the trough of a section', () => {
  it('holds the volume that is lost, however near it is looked at', () => {
    const sections = sectionsOfDesign(aDesign({ volumeLoss: LOSSES }), RULES);
    for (const halfWidth of [8, 60, 200]) {
      const { section, volume } = troughOfSection(sections, 500, halfWidth);
      expect(volume).toBeCloseTo(0.015 * FACE, 3);
      expect(section.points.at(-1)?.offset).toBeGreaterThanOrEqual(30);
    }
    const asFar = troughOfSection(sections, 500, 60).section;
    expect(asFar.points.at(-1)?.offset).toBe(60);
  });

  it('of twin bores holds that of both', () => {
    const bores = { kind: 'twin', spacing: 16, later: 'right', laterFactor: 1.5 } as const;
    const sections = sectionsOfDesign(aDesign({ bores }), RULES);
    expect(troughOfSection(sections, 500, 40).volume).toBeCloseTo(2.5 * 0.015 * FACE, 3);
  });

  it('is deepest over the bore, low to high', () => {
    const sections = sectionsOfDesign(aDesign({ volumeLoss: LOSSES }), RULES);
    const { section, largest } = troughOfSection(sections, 500, 60);
    const middle = section.points.find(({ offset }) => offset === 0);
    expect(largest).toEqual(middle?.settlement);
  });

  it('is not told where the method refuses', () => {
    const sections = sectionsOfDesign(aDesign({ levels: OUT_OF_THE_GROUND }), RULES);
    expect(troughOfSection(sections, 990, 20)).toMatchObject({ largest: null, volume: null });
  });
});

describe('settlement along a designed line', () => {
  it('is that of the sections across it, from end to end', () => {
    const design = aDesign({ volumeLoss: LOSSES, line: [[0, 0], [300, 0], [300, 200]] }); // prettier-ignore
    const rows = settlementAlong(design, RULES, 10);
    expect(rows.map(({ chainage }) => chainage)).toEqual(
      [0, 50, 100, 150, 200, 250, 300, 350, 400, 450, 500], // prettier-ignore
    );
    const sections = sectionsOfDesign(design, RULES);
    for (const { chainage, settlement } of rows) {
      const { points } = sections(chainage, 20);
      expect(settlement).toEqual(points.find(({ offset }) => offset === 0)?.settlement);
    }
  });

  it('has none where the method refuses', () => {
    const rows = settlementAlong(aDesign({ levels: OUT_OF_THE_GROUND }), RULES, 20);
    expect(rows[0]?.settlement).not.toBeNull();
    expect(rows.at(-1)?.settlement).toBeNull();
  });
});
