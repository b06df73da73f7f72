import { describe, expect, it } from 'vitest';
import { assessmentRules } from '../../../shared/assessment/run-inputs.ts';
import { sectionsOfDesign } from '../../../shared/assessment/sections-of-design.ts';
import { lineOnGround } from '../../../shared/evidence/line-on-ground.ts';
import { longSectionMarks } from '../../../shared/evidence/long-section-marks.ts';
import { ABOVE } from '../../../shared/evidence/planned-sections.ts';
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
const PLANNED = {
  kind: 'long section',
  ...{ denominator: 500, exaggeration: 2, settlementExaggeration: 300 },
  ...{ depth: 40, stretches: [{ from: 400, to: 520 }] },
} as const;
const DESIGN = aDesign({
  levels: [
    { chainage: 0, level: -20 },
    { chainage: 1000, level: -30 },
  ],
});

function drawn(buildings = [aPlanBuilding()]) {
  const about = someSheets({}, { design: DESIGN });
  const room = { line: lineOnGround(DESIGN.line), about, measure: evenMeasure };
  return longSectionMarks(AT, PLANNED, { ...room, material: aPlanMaterial({ buildings }) });
}

describe('longSectionMarks', () => {
  it('draws crown, axis and invert at their levels', () => {
    const ends = [AT.left, AT.left + 240];
    const ys = (level: number) => GROUND - level * 4;
    for (const above of [3, 0, -3]) {
      const line = [
        [ends[0], ys(-24 + above)],
        [ends[1], ys(-25.2 + above)],
      ];
      const close = line.map((spot) => spot.map((value) => expect.closeTo(value ?? NaN, 6) as number)); // prettier-ignore
      expect(ringMarks(drawn().marks)).toContainEqual(close);
    }
  });

  it('draws settlement over the line as the section across has it, times the exaggeration', () => {
    const { run } = someSheets({}, { design: DESIGN });
    const sections = sectionsOfDesign(DESIGN, assessmentRules(run.rules));
    const [line = []] = ringMarks(drawn().marks, 0.4);
    for (const end of [line[0], line.at(-1)]) {
      const [x, y] = end ?? [NaN, NaN];
      const chainage = 400 + (x - AT.left) / 2;
      const { settlement } = sections(chainage, 60).points.find(({ offset }) => offset === 0) ?? {};
      expect(y - GROUND).toBeCloseTo((settlement?.central ?? NaN) * 300 * 2, 6);
    }
  });

  it('stands a building over the line at its true width', () => {
    const over = aPlanBuilding({ parts: [[aRing(-80, -4, 12, 8)]] });
    const marks = flatMarks(drawn([over, aPlanBuilding({ id: '8' })]).marks);
    const standing = marks.flatMap((mark) => (mark.kind === 'toned' ? mark.rings : []));
    expect(standing).toHaveLength(1);
    const xs = standing[0]?.map(([x]) => x) ?? [];
    expect(Math.min(...xs)).toBeCloseTo(AT.left + 20 * 2, 6);
    expect(Math.max(...xs) - Math.min(...xs)).toBeCloseTo(24, 6);
  });

  it('keeps the references of buildings clear of its title', () => {
    const reference = 'R'.repeat(13);
    const over = aPlanBuilding({ reference, parts: [[aRing(-80, -4, 12, 8)]] });
    const words = wordMarks(drawn([over]).marks);
    const [name] = words.filter((one) => one.words === reference);
    const [title] = words.filter((one) => one.words.startsWith('Long section'));
    const top = (name?.at[1] ?? NaN) - evenMeasure(reference, name?.size ?? NaN, false);
    // below what hangs under its letters
    expect(top).toBeGreaterThan((title?.at[1] ?? NaN) + 0.7);
  });

  it('says from where to where it runs', () => {
    const words = wordMarks(drawn().marks).map((one) => one.words);
    expect(words).toContain('Long section from 0+400 to 0+520');
  });
});
