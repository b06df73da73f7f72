import { describe, expect, it } from 'vitest';
import {
  beginningLike,
  BLANK_OPTION,
  designIfWhole,
  draftOf,
  hasFirstValues,
  rebasedLine,
  rebasedOption,
  shaftsIfWhole,
} from '../../../../src/features/alignments/drafts/option-draft.ts';
import { optionChanges } from '../../../../src/features/alignments/option-changes.ts';
import type { AlignmentDesign } from '../../../../shared/schemas/alignments.ts';
import { aDesign, aRange } from '../../../support/designs.ts';

const DESIGN = aDesign({
  bores: { kind: 'twin', spacing: 15, later: 'left', laterFactor: 1.2 },
  volumeLoss: aRange(0.0143),
  troughWidth: aRange(0.55),
  intervals: [{ from: 100, to: 200, volumeLoss: aRange(0.007), troughWidth: aRange(0.4) }],
});

const SHAFTS = [{ name: 'East shaft', east: 600, north: 5.5, source: 'Drawing 12' }];
const A = { name: 'A', shafts: [] };

describe('an option while it is written', () => {
  it('is the same design again, to the last bit', () => {
    expect(designIfWhole(draftOf('A', DESIGN, []), DESIGN.line)).toEqual(DESIGN);
  });

  it('is no design while something is missing or wrong', () => {
    const draft = draftOf('A', DESIGN, []);
    expect(designIfWhole(BLANK_OPTION, DESIGN.line)).toBeNull();
    expect(designIfWhole(draft, DESIGN.line.slice(0, 1))).toBeNull();
    const odd = { ...draft, design: { ...draft.design, diameter: 'wide' } };
    expect(designIfWhole(odd, DESIGN.line)).toBeNull();
  });

  it('has the shafts that are written, once they are whole', () => {
    const draft = draftOf('A', DESIGN, SHAFTS);
    expect(shaftsIfWhole(draft)).toEqual(SHAFTS);
    const [shaft] = draft.shafts;
    const odd = { ...draft, shafts: draft.shafts.map((one) => ({ ...one, east: 'there' })) };
    expect(shaftsIfWhole(odd)).toBeNull();
    const twice = { ...draft, shafts: [...draft.shafts, ...draft.shafts] };
    expect([shaft?.east, shaftsIfWhole(twice)]).toEqual(['600', null]);
  });

  it('begins with what is common practice, until somebody writes otherwise', () => {
    const { design } = BLANK_OPTION;
    expect(design.volumeLoss).toEqual({ low: '0.5', central: '1', high: '1.5' });
    expect(design.troughWidth).toEqual({ low: '0.4', central: '0.5', high: '0.6' });
    expect(hasFirstValues(BLANK_OPTION)).toBe(true);
    const written = { ...design, volumeLoss: { ...design.volumeLoss, high: '2' } };
    expect(hasFirstValues({ ...BLANK_OPTION, design: written })).toBe(false);
  });

  it('begins like another without its intervals and further levels', () => {
    const levels = [40, 200].map((chainage) => ({ chainage, level: -20 }));
    const { name, design } = beginningLike({ ...DESIGN, levels });
    expect(name).toBe('');
    expect(design.levels).toEqual([{ chainage: '0', level: '-20' }]);
    expect(design.intervals).toEqual([]);
    expect(design.bores).toMatchObject({ kind: 'twin', spacing: '15' });
  });
});

describe('an option on top of what somebody else left', () => {
  it('keeps what was written and takes theirs for the rest', () => {
    const from = draftOf('A', DESIGN, []);
    const onto = draftOf('A, deep', { ...DESIGN, diameter: 7, groundLevel: 3 }, SHAFTS);
    const mine = { ...from, design: { ...from.design, diameter: '6.6' } };
    const merged = rebasedOption(mine, from, onto);
    expect(merged.name).toBe('A, deep');
    expect(merged.design).toEqual({ ...onto.design, diameter: '6.6' });
    expect(merged.shafts).toEqual(onto.shafts);
    const written = { ...from, shafts: [{ name: 'B', east: '1', north: '2', source: 'C' }] };
    expect(rebasedOption(written, from, onto).shafts).toEqual(written.shafts);
  });

  it('keeps a line that was drawn on, and else takes theirs', () => {
    const [from, mine, onto] = [0, 1, 2].map((north): AlignmentDesign['line'] => [
      [0, north],
      [9, 0],
    ]);
    if (from === undefined || mine === undefined || onto === undefined) throw new Error('no line');
    expect(rebasedLine(mine, from, onto)).toBe(mine);
    expect(rebasedLine([...from], from, onto)).toBe(onto);
  });
});

describe('what somebody changed of an option', () => {
  it('is said value by value', () => {
    const design = { ...DESIGN, diameter: 7, direction: 'backward' as const };
    expect(optionChanges({ ...A, design: DESIGN }, { name: 'B', design, shafts: SHAFTS })).toEqual([
      { path: 'Name', before: 'A', after: 'B' },
      { path: 'Diameter', before: '6 m', after: '7 m' },
      { path: 'Direction', before: 'as drawn', after: 'against the line' },
      { path: 'Shafts', before: 'none', after: 'East shaft at 600, 5.5 (Drawing 12)' },
    ]);
  });

  it('names a line whose points moved where length and start are the same', () => {
    const bent = (north: number): AlignmentDesign => ({
      ...DESIGN,
      line: [[0, 0], [50, north], [100, 0]],
    }); // prettier-ignore
    const [change] = optionChanges({ ...A, design: bent(9) }, { ...A, design: bent(-9) });
    expect(change?.after).toMatch(/points moved$/);
  });
});
