import { describe, expect, it } from 'vitest';
import { groundFrame } from '../../../shared/evidence/ground-frame.ts';
import { labelBoxOf } from '../../../shared/evidence/label-box.ts';
import type { Spot } from '../../../shared/evidence/marks.ts';
import type { PlanBackground } from '../../../shared/evidence/plan-material.ts';
import { streetNameMarks } from '../../../shared/evidence/street-names.ts';
import { wordMarks } from '../../support/marks.ts';
import { evenMeasure } from '../../support/plan-material.ts';

/** At 1 : 1000 a metre is a millimetre, and the middle of the grid that of the window. */
const WINDOW = { left: 0, top: 0, right: 200, bottom: 100 };
const FRAME = groundFrame(WINDOW, { centre: [0, 0], denominator: 1000 });

function aStreet(name: string | null, ...lines: (readonly (readonly [number, number])[])[]): PlanBackground {
  return { layer: 'streets', name, isArea: false, lines };
} // prettier-ignore

function namesOf(
  streets: readonly PlanBackground[],
  { taken = [], outlines = [] }: Partial<Parameters<typeof streetNameMarks>[2]> = {},
) {
  return wordMarks(streetNameMarks(FRAME, streets, { taken, outlines, measure: evenMeasure }));
}

const LEVEL = aStreet('Cable Street', [[-80, 0], [80, 0]]); // prettier-ignore

describe('streetNameMarks', () => {
  it('writes a name along its street, in the middle where it is free', () => {
    const [name, ...others] = namesOf([LEVEL]);
    expect(others).toEqual([]);
    expect(name).toMatchObject({ words: 'Cable Street', along: [1, 0], anchor: 'middle' });
    expect(Math.abs((name?.at[0] ?? NaN) - 100)).toBeLessThan(4);
  });

  it('writes a street of several pieces once, on the one with most room', () => {
    const upright = [[-60, -40], [-60, 40]] as const; // prettier-ignore
    const names = namesOf([aStreet('Long Row', [[0, 20], [30, 20]], upright)]); // prettier-ignore
    expect(names).toHaveLength(1);
    // read from below to above
    expect(names[0]?.along?.map((one) => expect.closeTo(one, 9) as number)).toEqual([0, -1]);
    expect(names[0]).toMatchObject({ words: 'Long Row' });
  });

  it('keeps clear of what stands on the sheet and of buildings', () => {
    const label = { left: 90, top: 45, right: 110, bottom: 55 };
    const [beside] = namesOf([LEVEL], { taken: [labelBoxOf(label)] });
    expect(Math.abs((beside?.at[0] ?? NaN) - 100)).toBeGreaterThan(10);
    const house: Spot[][] = [[[90, 45], [110, 45], [110, 55], [90, 55]]]; // prettier-ignore
    const [clear] = namesOf([LEVEL], { outlines: [house] });
    expect(Math.abs((clear?.at[0] ?? NaN) - 100)).toBeGreaterThan(10);
  });

  it('leaves out names without room, and streets without a name', () => {
    expect(namesOf([aStreet('Cable Street', [[0, 0], [8, 0]])])).toEqual([]); // prettier-ignore
    expect(namesOf([LEVEL], { taken: [labelBoxOf(WINDOW)] })).toEqual([]);
    expect(namesOf([aStreet(null, [[-80, 0], [80, 0]])])).toEqual([]); // prettier-ignore
  });

  it('names nothing but streets', () => {
    expect(namesOf([{ ...LEVEL, layer: 'water' }])).toEqual([]);
  });
});
