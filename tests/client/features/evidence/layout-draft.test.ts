// @vitest-environment node
import { describe, expect, it } from 'vitest';
import type { EvidenceLayout } from '../../../../shared/schemas/evidence.ts';
import {
  draftOfLayout,
  newDraft,
  readDraft,
} from '../../../../src/features/evidence/layout-draft.ts';
import { aPlan, aSchedule, aStrip } from '../../../support/evidence.ts';

const NEW = newDraft([10.4, 20.6]);

function sections(): EvidenceLayout {
  return {
    ...{ kind: 'sections', paper: 'A1', denominator: 250.5, fields: aPlan([0, 0]).fields },
    ...{ exaggeration: 2.5, settlementExaggeration: 200, isLong: false },
    ...{ across: [100, 250.5], halfWidth: 45 },
  };
}

describe('a layout that is written', () => {
  it.each([
    ['a plan', aPlan([1234.5, -67.8])],
    ['a series to the end', aStrip({ overlap: 12.5 })],
    ['a series over a stretch', aStrip({ from: 100, to: 250.5 })],
    ['sections', sections()],
    ['a schedule', aSchedule()],
  ])('is read again as it was kept: %s', (_, layout) => {
    expect(readDraft(draftOfLayout(layout, NEW))).toEqual({ layout });
  });

  it('begins as a plan on A3 round a whole metre of the grid', () => {
    const read = readDraft(NEW);
    expect(read).toMatchObject({ layout: { kind: 'plan', paper: 'A3', centre: [10, 21] } });
  });

  it('keeps what was written for other kinds', () => {
    const plan = draftOfLayout(aPlan([5, 6]), { ...NEW, from: '40', across: '1, 2' });
    expect(plan).toMatchObject({ east: '5', from: '40', across: '1, 2' });
  });

  it('says which field is wrong', () => {
    expect(readDraft({ ...NEW, denominator: '1', north: 'far' })).toEqual({
      faults: { denominator: 'At least 1 : 50.', north: 'Write a number.' },
    });
    const fields = { ...NEW.fields, revisions: [{ revision: '', date: '', change: '', by: '', checked: '' }] }; // prettier-ignore
    expect(readDraft({ ...NEW, fields })).toEqual({
      faults: { 'fields.revisions.0.revision': 'Give the revision a mark, as A.' },
    });
    const across = readDraft({ ...NEW, kind: 'sections', across: '10, here' });
    expect(Object.keys('faults' in across ? across.faults : {})).toEqual(['across']);
  });
});
