import { describe, expect, it } from 'vitest';
import { assessmentRules } from '../../../shared/assessment/run-inputs.ts';
import { sectionsOfDesign } from '../../../shared/assessment/sections-of-design.ts';
import { crossSectionMarks } from '../../../shared/evidence/cross-section-marks.ts';
import { lineOnGround } from '../../../shared/evidence/line-on-ground.ts';
import type { Spot } from '../../../shared/evidence/marks.ts';
import {
  ABOVE,
  sectionHeight,
  type PlannedSection,
} from '../../../shared/evidence/planned-sections.ts';
import type { AlignmentDesign } from '../../../shared/schemas/alignments.ts';
import { aDesign } from '../../support/designs.ts';
import { flatMarks, ringMarks, wordMarks } from '../../support/marks.ts';
import {
  aPlanBuilding,
  aPlanMaterial,
  evenMeasure,
  someSheets,
} from '../../support/plan-material.ts';
import { aRing } from '../../support/register-facts.ts';

const AT = { left: 39, top: 17 };
const GROUND = AT.top + ABOVE;
const MIDDLE = AT.left + 60 * 2;
type Planned = Extract<PlannedSection, { kind: 'cross sections' }>;

const PLANNED: Planned = {
  kind: 'cross sections',
  ...{ denominator: 500, exaggeration: 1, settlementExaggeration: 400 },
  ...{ depth: 26, chainages: [500], halfWidth: 60 },
};

function drawn(design: AlignmentDesign = aDesign(), asked: Partial<Planned> = {}, material = aPlanMaterial()) {
  const about = someSheets({}, { design });
  const room = { line: lineOnGround(design.line), material, about, measure: evenMeasure };
  return crossSectionMarks(AT, { ...PLANNED, ...asked }, room);
} // prettier-ignore

function sizeOf(ring: readonly Spot[]) {
  const [xs, ys] = [ring.map(([x]) => x), ring.map(([, y]) => y)];
  const [left, right, top, bottom] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)]; // prettier-ignore
  return { wide: right - left, tall: bottom - top, x: (left + right) / 2, y: (top + bottom) / 2 };
}

function boresIn({ marks }: ReturnType<typeof drawn>) {
  return ringMarks(marks, 0.4)
    .filter((ring) => ring.length === 48)
    .map(sizeOf);
}

describe('crossSectionMarks', () => {
  it('draws a bore at its true size, under the line at its level', () => {
    const [bore, ...others] = boresIn(drawn(aDesign({ diameter: 6.3 })));
    expect(others).toEqual([]);
    expect(Math.abs((bore?.wide ?? 0) - 6.3 * 2)).toBeLessThan(0.01);
    expect(Math.abs((bore?.tall ?? 0) - 6.3 * 2)).toBeLessThan(0.01);
    expect(bore?.x).toBeCloseTo(MIDDLE, 6);
    expect(bore?.y).toBeCloseTo(GROUND + 20 * 2, 6);
  });

  it('draws two bores apart by their spacing', () => {
    const bores = { kind: 'twin', spacing: 16, later: 'left', laterFactor: 1.2 } as const;
    const [one, other] = boresIn(drawn(aDesign({ bores }))).map(({ x }) => x);
    expect(Math.abs((one ?? 0) - (other ?? 0))).toBeCloseTo(32, 6);
  });

  it('draws levels as many times larger as it says', () => {
    const asked = { exaggeration: 2 };
    const [bore] = boresIn(drawn(aDesign(), asked));
    expect(bore?.wide).toBeCloseTo(12, 6);
    expect(bore?.tall).toBeCloseTo(24, 6);
    expect(bore?.y).toBeCloseTo(GROUND + 80, 6);
  });

  it('draws settlement over the line as large as the method has it, times the exaggeration', () => {
    const design = aDesign({ volumeLoss: { low: 0.01, central: 0.02, high: 0.03 } });
    const about = someSheets({}, { design });
    const section = sectionsOfDesign(design, assessmentRules(about.run.rules))(500, 60);
    const { settlement } = section.points.find(({ offset }) => offset === 0) ?? {};
    const lines = flatMarks(drawn(design).marks).flatMap((mark) =>
      mark.kind === 'shape' && mark.stroke?.ink === 'contour' ? [mark] : [],
    );
    expect(lines).toHaveLength(3);
    for (const [k, end] of (['low', 'high', 'central'] as const).entries()) {
      const spot = lines[k]?.rings[0]?.find(([x]) => Math.abs(x - MIDDLE) < 1e-6);
      const asked = settlement?.[end] ?? NaN;
      expect(asked).toBeGreaterThan(0.005);
      expect(((spot?.[1] ?? NaN) - GROUND) / 2).toBeCloseTo(asked * 400, 9);
    }
  });

  it('stands a building at its true width on its side of the line', () => {
    const left = aPlanBuilding({ parts: [[aRing(-5, 12, 10, 8)]] });
    const aside = aPlanBuilding({ id: '8', parts: [[aRing(30, 12, 10, 8)]] });
    const { marks } = drawn(aDesign(), {}, aPlanMaterial({ buildings: [left, aside] }));
    const standing = flatMarks(marks).flatMap((mark) => (mark.kind === 'toned' ? [mark] : []));
    expect(standing.map(({ tone }) => tone)).toEqual([{ by: 'category', number: 1 }]);
    const { wide, x } = sizeOf(standing[0]?.rings[0] ?? []);
    expect(wide).toBeCloseTo(8 * 2, 6);
    // looking along the line, what is left of it is at the left
    expect(x).toBeCloseTo(MIDDLE - 16 * 2, 6);
    expect(wordMarks(marks).some(({ words }) => words === 'B0007')).toBe(true);
  });

  it('writes the reference of every building that it meets, or tells which have no room', () => {
    const long = 'R'.repeat(20);
    const buildings = [
      aPlanBuilding({ id: '1', reference: 'first', parts: [[aRing(-5, 12, 10, 1)]] }),
      aPlanBuilding({ id: '2', reference: 'close', parts: [[aRing(-5, 11, 10, 1)]] }),
      aPlanBuilding({ id: '3', reference: long, parts: [[aRing(-5, -30, 10, 8)]] }),
      aPlanBuilding({
        id: '4',
        reference: 'both',
        parts: [[aRing(-5, -50, 10, 8)], [aRing(-5, -41.9, 10, 0.2)]],
      }),
    ];
    const { marks, unnamed } = drawn(aDesign(), {}, aPlanMaterial({ buildings }));
    const written = wordMarks(marks).map(({ words }) => words);
    expect(written).toContain('first');
    expect(unnamed).toEqual([
      { reference: 'close', where: '0+500, 12 m left to 11 m left' },
      { reference: long, where: '0+500, 22 m right to 30 m right' },
    ]);
    expect(flatMarks(marks).filter(({ kind }) => kind === 'toned')).toHaveLength(5);
    expect(written).toContain('both');
  });

  it('has settlement and levels to be read off at its sides', () => {
    const design = aDesign({ volumeLoss: { low: 0.01, central: 0.02, high: 0.03 } });
    const words = wordMarks(drawn(design).marks);
    const ticks = words.filter((one) => one.words.endsWith(' mm') && one.at[0] > AT.left + 240);
    expect(ticks.length).toBeGreaterThan(2);
    for (const { words: text, at } of ticks) {
      // drawn 400 times as large as lengths at 1 : 500, words a little under their tick
      expect(at[1] - 0.9 - GROUND).toBeCloseTo((parseFloat(text) / 1000) * 400 * 2, 6);
    }
    expect(words.map((one) => one.words)).toContain('Level, m');
  });

  it('keeps each section to its own height', () => {
    const asked = { chainages: [300, 500, 700] };
    const each = sectionHeight(PLANNED);
    const tops = boresIn(drawn(aDesign(), asked)).map(({ y }) => y);
    expect(tops).toEqual([0, 1, 2].map((k) => expect.closeTo(GROUND + 40 + k * each, 6) as number)); // prettier-ignore
  });
});
