import { describe, expect, it } from 'vitest';
import { lineOnGround } from '../../../shared/evidence/line-on-ground.ts';
import { sheetLayout } from '../../../shared/evidence/paper-sizes.ts';
import {
  boxOfSection,
  plannedSections,
  sectionHeight,
} from '../../../shared/evidence/planned-sections.ts';
import { aDesign } from '../../support/designs.ts';
import { someSections } from '../../support/evidence.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';

const DESIGN = aDesign();
const LINE = lineOnGround(DESIGN.line);

function planned(asked: Parameters<typeof someSections>[0], design = DESIGN) {
  const layout = someSections(asked);
  const line = lineOnGround(design.line);
  return plannedSections(layout, line, sheetLayout(layout.paper), design);
}

describe('plannedSections', () => {
  it('shows the whole line in stretches that join, as many to a sheet as fit', () => {
    const sheets = planned({ isLong: true, across: [] });
    const stretches = sheets.flatMap((one) => (one.kind === 'long section' ? one.stretches : []));
    expect(stretches[0]?.from).toBe(0);
    expect(stretches.at(-1)?.to).toBe(1000);
    for (const [k, { from }] of stretches.slice(1).entries()) expect(from).toBe(stretches[k]?.to);
    const { window } = sheetLayout('A3');
    for (const { from, to } of stretches)
      expect((to - from) * 2).toBeLessThanOrEqual(window.right - window.left);
  });

  it('puts no more sections on a sheet than its window is high', () => {
    const sheets = planned({ across: [100, 300, 500, 700, 900] });
    const found = sheets.flatMap((one) => (one.kind === 'cross sections' ? [one] : []));
    expect(found.flatMap(({ chainages }) => chainages)).toEqual([100, 300, 500, 700, 900]);
    const { window } = sheetLayout('A3');
    for (const one of found) {
      expect(sectionHeight(one) * one.chainages.length).toBeLessThanOrEqual(
        window.bottom - window.top,
      );
    }
  });

  it.each([
    ['wider than the sheet', { halfWidth: 80 }, 'halfWidth'],
    ['higher than the sheet', { exaggeration: 5 }, 'exaggeration'],
    ['higher than the sheet along the line', { isLong: true, across: [], exaggeration: 5 }, 'exaggeration'],
    ['beyond the line', { across: [100, 1001] }, 'across'],
    ['of nothing', { across: [] }, 'across'],
  ])('refuses sections %s', (_, asked, field) => {
    expect(methodErrorOf(() => planned(asked))).toEqual({ code: 'outside-range', field });
  }); // prettier-ignore

  it('takes sections just as wide as the sheet', () => {
    const { window } = sheetLayout('A3');
    const widest = (window.right - window.left - 36) / 4;
    expect(planned({ halfWidth: widest })).toHaveLength(1);
    expect(() => planned({ halfWidth: widest + 0.1 })).toThrow();
  });
});

describe('the depth of sections', () => {
  it('is from the ground to half a diameter under the invert, the deepest', () => {
    const levels = [
      { chainage: 0, level: -20 },
      { chainage: 1000, level: -30 },
    ];
    const design = aDesign({ levels, groundLevel: 2 });
    expect(planned({ across: [0] }, design)[0]?.depth).toBe(28);
    expect(planned({ across: [0, 500] }, design)[0]?.depth).toBe(33);
  });
});

describe('boxOfSection', () => {
  it('is the ground that cuts run over', () => {
    const [section] = planned({ across: [200, 260], halfWidth: 40 });
    if (section === undefined) throw new Error('There is none.');
    expect(boxOfSection(section, LINE)).toEqual({ west: -301, south: -41, east: -239, north: 41 });
  });

  it('is the ground that a long section runs over', () => {
    const [section] = planned({ isLong: true, across: [], denominator: 5000 });
    if (section === undefined) throw new Error('There is none.');
    expect(boxOfSection(section, LINE)).toEqual({ west: -501, south: -1, east: 501, north: 1 });
  });
});
