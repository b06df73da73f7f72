// @vitest-environment node
import { describe, expect, it } from 'vitest';
import {
  fieldWords,
  unusedColumns,
  withColumn,
} from '../../../../src/features/imports/field-words.ts';
import { metresOf } from '../../../../src/features/imports/metres-of.ts';
import { homeOfRows } from '../../../../src/features/imports/home-of-rows.ts';
import { outlinePicture } from '../../../../src/features/imports/outline-picture.ts';
import { accuracyInWords } from '../../../../src/features/imports/place-words.ts';
import { readinessOf } from '../../../../src/features/imports/readiness.ts';
import { changeWords, reasonOf, valueWords } from '../../../../src/features/imports/row-words.ts';
import { levelFacts } from '../../../../src/features/ground/ground-words.ts';
import { levelOf } from '../../../../src/features/ground/level-of.ts';
import { anImportAnswer, anImportRow, importCounts } from '../../../support/import-answers.ts';

describe('readinessOf', () => {
  it('says how many come in', () => {
    expect(readinessOf(anImportAnswer())).toEqual({
      label: 'Bring in 2\u2009253 buildings',
      reason: null,
    });
    const one = anImportAnswer({ kind: 'values', counts: importCounts({ new: 0, changed: 1 }) });
    expect(readinessOf(one).label).toBe('Change 1 building');
  });

  it.each([
    ['crs', 'Say which system the coordinates are in.'],
    ['reference', 'Say which column holds the reference.'],
    ['columns', 'Say which column is what.'],
    ['settle', 'Settle the 3 buildings that changed here and in the file.'],
  ] as const)('says what is missing: %s', (missing, reason) => {
    const counts = importCounts({ conflict: 3 });
    expect(readinessOf(anImportAnswer({ missing: [missing], counts })).reason).toBe(reason);
  });

  it('says when there is nothing to do', () => {
    const same = importCounts({ new: 0, same: 2253 });
    expect(readinessOf(anImportAnswer({ counts: same })).reason).toBe(
      'The register has all of it already.',
    );
    const refused = importCounts({ new: 0, refused: 2253 });
    expect(readinessOf(anImportAnswer({ counts: refused })).reason).toMatch(
      /^Every row is refused/,
    );
  });
});

describe('the words of rows', () => {
  const change = { field: 'storeys', ours: 3, theirs: 4, isConflict: false, isKept: false };

  it('give the first remark, else the fields that change', () => {
    expect(reasonOf(anImportRow({ remarks: ['Its outline crosses itself.', 'b'] }))).toBe(
      'Its outline crosses itself.',
    );
    expect(reasonOf(anImportRow({ changes: [change, { ...change, field: 'footprint' }] }))).toBe(
      'Storeys, Footprint',
    );
    expect(reasonOf(anImportRow())).toBe('');
  });

  it('say what a changed value comes to', () => {
    expect(changeWords(change, 'ask')).toBe('');
    expect(changeWords({ ...change, isKept: true }, 'ask')).toBe('changed here by hand; kept');
    const both = { ...change, isConflict: true };
    expect(changeWords(both, 'ask')).toBe('both changed');
    expect(changeWords(both, 'keep ours')).toBe('both changed; ours stays');
    expect(changeWords(both, 'take theirs')).toBe('both changed; theirs is taken');
  });

  it('write values', () => {
    const words = [null, 1204.5, 'raft'].map((value) => valueWords(value, 'foundation'));
    expect(words).toEqual(['not known', '1\u2009204.5', 'raft']);
    expect(valueWords(71.57579638819152, 'footprint')).toBe('71.6 m²');
  });
});

describe('the fields of a mapping', () => {
  it('have a name and a unit', () => {
    expect(fieldWords('eavesHeight')).toEqual({ label: 'Eaves above ground', unit: 'm' });
    expect(fieldWords('reference')).toEqual({ label: 'Reference' });
    expect(fieldWords('name')).toEqual({ label: 'Name' });
  });

  it('take a column, give it up, and leave the others', () => {
    expect(withColumn({ reference: 'a' }, 'use', 'b')).toEqual({ reference: 'a', use: 'b' });
    expect(withColumn({ reference: 'a', use: 'b' }, 'use', '')).toEqual({ reference: 'a' });
    const left = unusedColumns(anImportAnswer().columns, { reference: 'ref' });
    expect(left.map(({ name }) => name)).toEqual(['currentUse', 'localId']);
  });
});

describe('figures that people write', () => {
  it('are metres with a point, a comma or a true minus', () => {
    expect(['1.5', '1,5', '\u22122', '', ' 7 '].map(metresOf)).toEqual([1.5, 1.5, -2, 0, 7]);
    expect(['x', '2001', '1.2.3'].map(metresOf)).toEqual([Number.NaN, Number.NaN, Number.NaN]);
  });

  it('are levels, or none', () => {
    expect(['12,5', '', 'x', '\u22123'].map(levelOf)).toEqual([12.5, undefined, undefined, -3]);
  });

  it('tell how far footprints may be off', () => {
    expect([0, 5, null].map(accuracyInWords)).toEqual([
      'nothing is lost',
      'up to 5 m off',
      'not known',
    ]);
  });

  it('count the buildings by where their level is from', () => {
    const counts = { fromGround: 1190, fromFile: 0, byHand: 1, unknown: 0 };
    expect(levelFacts(counts)).toEqual([
      ['Take it from here', '1\u2009190 buildings'],
      ['By hand', '1 building'],
    ]);
  });
});

describe('outlinePicture', () => {
  it('draws two outlines in one frame, north up', () => {
    const square = [[[[0, 0], [1, 0], [1, 1], [0, 0]]]] as const; // prettier-ignore
    const { viewBox, paths } = outlinePicture([square, []]);
    const [, , width = 0, height = 0] = viewBox.split(' ').map(Number);
    expect(width).toBeCloseTo(height, 1);
    expect(paths).toEqual([`M8 112L112 112L112 8L8 112Z`, '']);
  });
});

describe('homeOfRows', () => {
  it('shows all rows of a town, and of scattered ones the middle', () => {
    const town = [-4.75, 40, -4.73, 40.02] as const;
    expect(homeOfRows(town, [])).toEqual(town);
    const scattered = [-4.82, 40, -4.69, 40.085] as const;
    expect(homeOfRows(scattered, [])).toBeNull();
    const [west, south, east, north] =
      homeOfRows(scattered, [[-4.7, 40.02], [-4.71, 40.03], [-4.82, 40.08]]) ?? []; // prettier-ignore
    expect(((west ?? 0) + (east ?? 0)) / 2).toBeCloseTo(-4.71, 6);
    expect(((south ?? 0) + (north ?? 0)) / 2).toBeCloseTo(40.03, 6);
  });
});
