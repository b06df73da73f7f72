import { describe, expect, it } from 'vitest';
import { CAUTIONS } from '../../../shared/cautions.ts';
import { CATEGORIES } from '../../../shared/damage/categories.ts';
import { drawnSheets } from '../../../shared/evidence/drawn-sheets.ts';
import type { Mark, Rectangle } from '../../../shared/evidence/marks.ts';
import { plannedSheets } from '../../../shared/evidence/planned-sheets.ts';
import type { PlanMaterial } from '../../../shared/evidence/plan-material.ts';
import type { Sheet } from '../../../shared/evidence/sheet.ts';
import { MATERIAL_LIMITS } from '../../../shared/schemas/evidence-material.ts';
import type { DrawnLayout, TitleFields } from '../../../shared/schemas/evidence.ts';
import { aDesign, aRange } from '../../support/designs.ts';
import { aPlan, aStrip, someSections } from '../../support/evidence.ts';
import { beyond, endsOfWords, flatMarks, wordMarks } from '../../support/marks.ts';
import {
  aPlanMaterial,
  aRowOfHouses,
  evenMeasure,
  someSheets,
} from '../../support/plan-material.ts';

const FIELDS: TitleFields = {
  ...{ title: 'Plan of the quay', subtitle: 'Central values', number: 'PD-101' },
  ...{ prepared: 'Ada', checked: 'Ben', approved: 'Cleo', issued: '2026-12-01' },
  revisions: [{ revision: 'B', date: '2026-12-01', change: 'Line moved', by: 'AD', checked: 'BE' }],
};
const MATERIAL = aPlanMaterial({
  buildings: aRowOfHouses(12, { west: -50, south: 6, wide: 9, deep: 8 }),
  contours: [{ level: 0.01, line: [[-70, 5], [0, 6], [70, 5]], isClosed: false }], // prettier-ignore
});

function drawn(layout: DrawnLayout, material: PlanMaterial = MATERIAL): Sheet[] {
  const about = someSheets(FIELDS);
  const all = plannedSheets(layout, about.run.design);
  return all.flatMap((one) => drawnSheets(one, all, material, about, evenMeasure));
}

function textOf(sheets: readonly Sheet[]): string {
  return sheets.flatMap(({ marks }) => wordMarks(marks).map(({ words }) => words)).join(' ');
}

const LAYOUTS: readonly (readonly [string, DrawnLayout])[] = [
  ...(['A4', 'A3', 'A1', 'A0'] as const).map((paper) => [`a plan on ${paper}`, { ...aPlan([0, 0]), paper }] as const),
  ['a plan of settlement', { ...aPlan([0, 0]), content: { ...aPlan([0, 0]).content, shows: 'settlement' } }],
  ['a strip', aStrip({ denominator: 2500, overlap: 20 })],
  ['a strip on A4', aStrip({ paper: 'A4', denominator: 2500, overlap: 20 })],
  ['sections', someSections({ isLong: true, across: [450, 500] })],
  ['sections on A4', someSections({ paper: 'A4', denominator: 1000, isLong: true, across: [450, 500] })],
]; // prettier-ignore

describe('drawnSheets', () => {
  const sheets = drawn(aPlan([0, 0]));
  const words = textOf(sheets);

  it('says the fields of the title block, beside their names', () => {
    const [{ marks } = { marks: [] }] = sheets;
    const texts = wordMarks(marks).map((mark) => mark.words);
    expect(texts).toEqual(expect.arrayContaining(['Port Dogger crossing', FIELDS.title, FIELDS.subtitle])); // prettier-ignore
    for (const [name, value] of [
      ...[['Drawing', 'PD-101'], ['Revision', 'B'], ['Scale, A3', '1 : 500'], ['Sheet', '1 of 1']],
      ...[['Prepared', 'Ada'], ['Checked', 'Ben'], ['Approved', 'Cleo'], ['Issued', '2026-12-01']],
      ...[['Kind', 'Plan'], ['Run', '4'], ['Language', 'en']],
    ]) {
      const after = texts.flatMap((text, k) => (text === name ? [texts[k + 1]] : []));
      expect(after).toContain(value);
    } // prettier-ignore
    for (const cell of Object.values(FIELDS.revisions[0] ?? {})) expect(texts).toContain(cell);
  });

  it('leaves fields that nobody filled in to be written by hand', () => {
    const about = someSheets({ title: '' });
    const all = plannedSheets(aPlan([0, 0]), about.run.design);
    const [sheet] = all.flatMap((one) => drawnSheets(one, all, MATERIAL, about, evenMeasure));
    const texts = wordMarks(sheet?.marks ?? []).map((mark) => mark.words);
    expect(texts[texts.indexOf('Approved') + 1]).toBe('');
  });

  it.each(CAUTIONS)('has the caution: %s', (caution) => {
    expect(words).toContain(caution);
  });

  it('says of which run it is, on which grid, and its scale', () => {
    expect(words).toContain('Run 4 of A, version 1; method 1.1.0, rules version 1, register version 1, started 2026-12-01 UTC.'); // prettier-ignore
    expect(words).toContain('EPSG:32632');
    expect(words).toContain('Scale 1 : 500 on A3');
  });

  it('has every category in its legend, with the buildings of the sheet that have it', () => {
    const texts = wordMarks(sheets[0]?.marks ?? []).map((mark) => mark.words.toLowerCase());
    const counts = CATEGORIES.map(({ name }) => texts[texts.indexOf(name.toLowerCase()) + 1]);
    expect(counts).toEqual(['3', '3', '2', '2', '2']);
  });

  it('says when there is more background than it draws', () => {
    const street = { layer: 'streets', name: null, isArea: false, lines: [] } as const;
    const full = Array.from({ length: MATERIAL_LIMITS.background }, () => street);
    const told = /largest shapes/;
    expect(textOf(drawn(aPlan([0, 0]), { ...MATERIAL, background: full }))).toMatch(told);
    expect(textOf(drawn(aPlan([0, 0]), { ...MATERIAL, background: full.slice(1) }))).not.toMatch(told); // prettier-ignore
  });

  it('counts no building whose middle is beyond the sheet', () => {
    const texts = wordMarks(drawn(aPlan([400, 0]))[0]?.marks ?? []).map((mark) => mark.words.toLowerCase()); // prettier-ignore
    const counts = CATEGORIES.map(({ name }) => texts[texts.indexOf(name.toLowerCase()) + 1]);
    expect(counts).toEqual(['0', '0', '0', '0', '0']);
  });
});

describe.each(LAYOUTS)('%s', (_, layout) => {
  const sheets = drawn(layout);

  it('has no words under 6.5 points', () => {
    for (const { marks } of sheets) {
      for (const { size, words } of wordMarks(marks))
        expect([words, size >= 6.5]).toEqual([words, true]);
    }
  });

  it('keeps everything inside of the paper', () => {
    for (const { width, height, marks } of sheets) {
      const paper = { left: 0, top: 0, right: width, bottom: height };
      for (const mark of outside(marks)) {
        const spots = mark.kind === 'words' ? endsOfWords(mark, evenMeasure) : mark.rings.flat();
        expect(spots.filter((spot) => beyond(paper, spot) > 0)).toEqual([]);
      }
    }
  });

  it('cuts no words at the sides of a window', () => {
    for (const [window, mark] of sheets.flatMap(({ marks }) => insideOf(marks))) {
      const ends = endsOfWords(mark, evenMeasure);
      expect([mark.words, ends.filter((spot) => beyond(window, spot) > 0)]).toEqual([mark.words, []]); // prettier-ignore
    }
  });

  it('says all of the cautions and the run, in its notes or on a sheet behind', () => {
    const words = textOf(sheets);
    for (const caution of CAUTIONS) expect(words).toContain(caution);
    expect(words).toContain('Run 4 of A');
  });
});

/** Marks that no window cuts. */
function outside(marks: readonly Mark[]) {
  return flatMarks(marks.filter(({ kind }) => kind !== 'within'));
}

function insideOf(marks: readonly Mark[]) {
  return marks.flatMap((mark) =>
    mark.kind === 'within'
      ? wordMarks(mark.marks).map((one): [Rectangle, typeof one] => [mark.window, one])
      : [],
  );
}

describe('sheets behind a plan', () => {
  it('hold on A4 the notes that do not fit', () => {
    const [plan, behind, ...others] = drawn({ ...aPlan([0, 0]), paper: 'A4' });
    expect(others).toEqual([]);
    expect(textOf(plan === undefined ? [] : [plan])).not.toContain('Notes');
    expect(textOf(behind === undefined ? [] : [behind])).toContain('Notes');
    expect(textOf(behind === undefined ? [] : [behind])).toContain('Sheet 1 of 1');
    expect(textOf(behind === undefined ? [] : [behind])).toContain('List 1 of 1');
  });

  it('hold what has no room on a sheet of sections', () => {
    const part = { volumeLoss: aRange(0.02), troughWidth: aRange(0.5) };
    const intervals = Array.from({ length: 12 }, (_, k) => ({ from: 50 * k, to: 50 * k + 50, ...part })); // prettier-ignore
    const layout = someSections({ paper: 'A4', denominator: 1000 });
    const about = someSheets(FIELDS, { design: aDesign({ intervals }) });
    const all = plannedSheets(layout, about.run.design);
    const sheets = all.flatMap((one) => drawnSheets(one, all, MATERIAL, about, evenMeasure));
    expect(sheets.length).toBeGreaterThan(1);
    const words = textOf(sheets);
    for (const caution of CAUTIONS) expect(words).toContain(caution);
    expect(words).toContain('Line moved');
  });

  it('are none where all has room', () => {
    expect(drawn({ ...aPlan([0, 0]), paper: 'A0' })).toHaveLength(1);
  });

  it('list every label without room, and the plan says so', () => {
    const rows = Array.from({ length: 5 }, (_, row) =>
      aRowOfHouses(40, { west: -60, south: 8 + 9 * row, wide: 1, deep: 8 }).map((one) => ({
        ...{ ...one, id: `${row}-${one.id}`, reference: `${row}/${one.id}` },
      })),
    ).flat();
    const [plan, ...lists] = drawn(aPlan([0, 0]), aPlanMaterial({ buildings: rows }));
    expect(textOf(plan === undefined ? [] : [plan])).toContain('Labels without room on the plan are listed on the sheet behind this one.'); // prettier-ignore
    const texts = lists.flatMap(({ marks }) => wordMarks(marks).map(({ words }) => words));
    const count = Number(/Labels without room on the plan: (\d+)/.exec(texts.join(' '))?.[1]);
    expect(count).toBeGreaterThan(20);
    for (let number = 1; number <= count; number++) expect(texts).toContain(String(number));
  });
});
