import { describe, expect, it } from 'vitest';
import { boxOfSheet } from '../../../shared/evidence/box-of-sheet.ts';
import { lineOnGround } from '../../../shared/evidence/line-on-ground.ts';
import { plannedSheets, type PlannedPlan } from '../../../shared/evidence/planned-sheets.ts';
import { aDesign } from '../../support/designs.ts';
import { aPlan, aStrip } from '../../support/evidence.ts';
import { beyond } from '../../support/marks.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';

function plansOf(strip: Parameters<typeof aStrip>[0]): PlannedPlan[] {
  return plannedSheets(aStrip(strip), aDesign()).map(({ what }) => {
    if (what.kind !== 'plan') throw new Error('It is no plan.');
    return what;
  });
}

describe('plannedSheets of a plan', () => {
  it('is one sheet round its point, at its scale, north up', () => {
    const [sheet, ...others] = plannedSheets(aPlan([120, -40]), aDesign());
    expect(others).toEqual([]);
    expect(sheet).toMatchObject({ number: 1, of: 1, layout: { paper: 'A3' } });
    expect(sheet?.what).toMatchObject({ kind: 'plan', stretch: null, matches: [] });
    if (sheet?.what.kind !== 'plan') throw new Error('It is no plan.');
    const { window, box, right } = sheet.what.frame;
    expect(right).toEqual([1, 0]);
    expect((box.west + box.east) / 2).toBeCloseTo(120, 9);
    expect((box.south + box.north) / 2).toBeCloseTo(-40, 9);
    expect(box.east - box.west).toBeCloseTo((window.right - window.left) * 0.5, 9);
    expect(boxOfSheet(sheet, lineOnGround(aDesign().line))).toEqual(box);
  });
});

describe('plannedSheets of a strip', () => {
  it('is numbered, and covers what is asked for', () => {
    const sheets = plannedSheets(aStrip({ from: 100, to: 800 }), aDesign());
    expect(sheets.map(({ number }) => number)).toEqual(sheets.map((_, k) => k + 1));
    expect(new Set(sheets.map(({ of }) => of))).toEqual(new Set([sheets.length]));
    const stretches = plansOf({ from: 100, to: 800 }).map(({ stretch }) => stretch);
    expect(stretches[0]?.[0]).toBe(100);
    expect(stretches.at(-1)?.[1]).toBe(800);
  });

  it.each([null, 4000])('to %s ends with the line', (to) => {
    expect(plansOf({ to }).at(-1)?.stretch?.[1]).toBe(1000);
  });

  it('hands over from sheet to sheet at one chainage that both show', () => {
    const plans = plansOf({ overlap: 24 });
    const line = lineOnGround(aDesign().line);
    expect(plans.length).toBeGreaterThan(4);
    expect(plans[0]?.matches.map(({ isAhead }) => isAhead)).toEqual([true]);
    expect(plans.at(-1)?.matches.map(({ isAhead }) => isAhead)).toEqual([false]);
    for (const [k, { frame, matches }] of plans.entries()) {
      for (const { chainage, sheet, isAhead } of matches) {
        expect(sheet).toBe(isAhead ? k + 2 : k);
        expect(beyond(frame.window, frame.place(line.pointAt(chainage)))).toBe(0);
        const back = plans[sheet - 1]?.matches.find((one) => one.isAhead !== isAhead);
        expect(back).toEqual({ chainage, sheet: k + 1, isAhead: !isAhead });
      }
    }
  });

  it.each([
    ['an overlap that leaves nothing of a sheet', { overlap: 900 }, 'overlap'],
    ['a start where the line has ended', { from: 1000 }, 'from'],
    ['a start beyond the end', { from: 700, to: 600 }, 'from'],
    ['more sheets than one print may have', { denominator: 50, paper: 'A4', overlap: 5 }, 'denominator'],
    ['an overlap that leaves next to nothing', { overlap: 133.39 }, 'denominator'],
  ] as const)('refuses %s', (_, strip, field) => {
    const refused = methodErrorOf(() => plannedSheets(aStrip(strip), aDesign()));
    expect(refused).toEqual({ code: 'outside-range', field });
  }); // prettier-ignore
});
