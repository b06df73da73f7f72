import { describe, expect, test } from 'vitest';
import { sheetDocument } from '../../../../server/documents/sheet/sheet-document.ts';
import { percentFigure } from '../../../../server/documents/sheet/figures.ts';
import { openSamples } from '../../../../shared/assessment/opened-samples.ts';
import { sheetOfBuilding } from '../../../../shared/assessment/sheet-of-building.ts';
import { CAUTIONS } from '../../../../shared/cautions.ts';
import { plainWords } from '../../../../shared/presentation/plain-words.ts';
import { reserveWords } from '../../../../shared/presentation/result-words.ts';
import { SAMPLES_CAUTION } from '../../../../shared/presentation/sample-words.ts';
import {
  bookmarksOfPdf,
  factsOfPdf,
  fontsOfPdf,
  pagesOfPdf,
  textOfPdf,
  wordBoxesOfPdf,
} from '../../../support/pdf-tools.ts';
import { aRing } from '../../../support/register-facts.ts';
import { aSheetMaterial, FAR_AWAY } from '../../../support/sheet-material.ts';

const MATERIAL = aSheetMaterial();
const PDF = await sheetDocument(MATERIAL);
const TEXT = textOfPdf(PDF);
const LONG =
  'Worshipful Company of Harbour Pilots’ and Lightermen’s Old Almshouses with Chapel, Refectory and Infirmary';

/** Nothing stands outside of the margins or under the foot of a page. */
function expectInside(pdf: Uint8Array): void {
  const outside = wordBoxesOfPdf(pdf).filter(
    ({ left, top, right, bottom }) => left < 29 || right > 566 || top < 24 || bottom > 836,
  );
  expect(outside).toEqual([]);
}

/** A sign that no font has is written by its number. */
function expectEverySign(text: string): void {
  expect(text).not.toMatch(/U\+|\uFFFD|\u0000/u);
}

describe('the sheet of a building as a document', () => {
  test('is upright A4 with its fonts, a title, a language and bookmarks', () => {
    const facts = factsOfPdf(PDF);
    expect(facts['Page size']).toContain('(A4)');
    expect(facts.Title).toBe('Sheet B0007, Sailmakers’ Hall, run 4');
    expect(facts.Author).toBe('Port Dogger crossing');
    expect(Buffer.from(PDF).toString('latin1')).toContain('/Lang (en-GB)');
    for (const font of fontsOfPdf(PDF))
      expect(font).toMatchObject({ isEmbedded: true, isReadable: true });
    expect(bookmarksOfPdf(PDF)).toEqual([
      ...['Answer', 'Where and what', 'Walls', 'Section', 'Category by strain', 'In plain words'],
      ...[
        'Bracket and breakpoint',
        'Stage and holds',
        'Cautions',
        'Decisions, visits and measures',
        'Working',
      ],
    ]);
  });

  test('says on every page what it is, of which run and which page of how many', () => {
    const pages = pagesOfPdf(PDF);
    expect(pages.length).toBeGreaterThan(3);
    for (const [k, page] of pages.entries()) {
      expect(page).toContain('Sailmakers’ Hall');
      expect(page).toContain('2026-12-01 14:02 UTC, by Ada');
      expect(page).toContain('2026-12-02 09:30 UTC');
      expect(page).toContain(`${k + 1} of ${pages.length}`);
    }
  });

  test('holds the figures of the record and the sentences of the screen', () => {
    const { result } = MATERIAL.building;
    expect(result.category).not.toBeNull();
    for (const strain of [result.strainLow, result.strain, result.strainHigh]) {
      expect(TEXT).toContain(percentFigure(strain ?? NaN, 3));
    }
    expect(TEXT).toContain(percentFigure(result.deflectionRatio ?? NaN, 4));
    expect(TEXT).toContain(percentFigure(result.horizontalStrain ?? NaN, 4));
    const words = TEXT.replaceAll('\u00a0', ' ');
    expect(words).toContain(reserveWords(result).replaceAll('\u00a0', ' '));
    for (const sentence of [...plainWords(result), ...CAUTIONS]) expect(words).toContain(sentence);
    expect(words).toContain('the same figures as recorded, to the last digit');
    expect(words).toContain('Nothing has been decided yet.');
    expect(words).toContain('Scale 1 : 500 on A4');
  });

  test('lacks no sign and lets nothing stand outside of its margins', () => {
    expectEverySign(TEXT);
    expect(TEXT).toMatch(/≥/u);
    expect(TEXT).toMatch(/√/u);
    expectInside(PDF);
  });

  test('says so where the figures are not those on record', async () => {
    const { building } = MATERIAL;
    const other = { ...building, result: { ...building.result, settlement: 0.5 } };
    const text = textOfPdf(await sheetDocument({ ...MATERIAL, building: other }));
    expect(text).toContain('the figures differ from the record of run 4');
  });

  test('prints what was decided, row by row, over as many pages as it takes', async () => {
    const history = Array.from({ length: 60 }, (_, k) => ({
      ...{
        date: '2026-06-01',
        what: `Measure ${k}`,
        by: 'Ada',
        detail: 'First line.\nSecond line.',
      },
    }));
    const pages = pagesOfPdf(await sheetDocument({ ...MATERIAL, history }));
    const text = pages.join(' ');
    for (const { what } of history) expect(text).toContain(what);
    expect(text).not.toContain('Nothing has been decided yet.');
    expect(pages.filter((page) => /What\s+By\s+Detail/.test(page)).length).toBeGreaterThan(1);
  });
});

describe('a sheet with a sampled run', () => {
  const LONG_WALLS = { parts: [[aRing(-5, 2, 10, 30).map(([e, n]): [number, number] => [e, n])]] };
  const asked = aSheetMaterial(LONG_WALLS, { samples: 3 });
  const { run, building } = asked;
  const sheet = sheetOfBuilding(run.design, run.rules, building.facts, new Map());
  const samples = openSamples(sheet, 3);

  test('has the share in each category, the strains and where they are from, as the screen has them', async () => {
    const pdf = await sheetDocument(asked);
    const text = textOfPdf(pdf);
    expect(bookmarksOfPdf(pdf)).toContain('Sampled run');
    expect(text).toContain('500 samples, seed 3');
    expect(text).toContain(SAMPLES_CAUTION);
    for (const { share, count } of samples?.categories ?? []) {
      expect(text).toMatch(new RegExp(`${percentFigure(share, 1)} %\\s+${count}\\b`));
    }
    for (const { strain } of samples?.strains ?? [])
      expect(text).toContain(percentFigure(strain, 3));
    expect(text).toMatch(/volume loss 1\s\/\s2\s\/\s3\s%; K\s0\.4\s\/\s0\.5\s\/\s0\.6/);
    expect(text.match(/Sensitive, most of all to|Settled: the category/g)).toHaveLength(1);
    expectInside(pdf);
    expectEverySign(text);
  });

  test('has the working of the sample in the middle, and names the works that it cites', async () => {
    const text = textOfPdf(await sheetDocument(asked));
    expect(text).toContain('Working of the sampled run');
    expect(text).toContain('volume loss drawn for ground 1');
    expect(text).toContain('Technometrics 21(2)');
    expect(text.match(/Works cited/g)).toHaveLength(1);
  });

  test('says nothing of samples where nobody asked', () => {
    expect(TEXT).not.toContain('Sampled run');
  });

  test('has them of a building that screening lets go, and none where nothing could be worked out', async () => {
    const far = textOfPdf(await sheetDocument(aSheetMaterial({ parts: FAR_AWAY }, { samples: 3 })));
    expect(far).toContain('500 samples, seed 3');
    const fault = aSheetMaterial({ foundingLevel: -19 }, { samples: 3 });
    expect(textOfPdf(await sheetDocument(fault))).not.toContain('Sampled run');
  });
});

describe('a short sheet', () => {
  test('is that of a building which screening lets go: its figures against the limits, no strain', async () => {
    const material = aSheetMaterial({ parts: FAR_AWAY });
    expect(material.building.result.stage).toBe(1);
    const pdf = await sheetDocument(material);
    const text = textOfPdf(pdf);
    expect(text).toContain('Let go at stage 1');
    expect(text).toContain('limit 10.0 mm');
    expect(text).not.toContain('Breakpoint');
    expect(text).not.toContain('Working of wall');
    expect(pagesOfPdf(pdf).length).toBeLessThan(3);
    expectInside(pdf);
  });

  test('is that of a building that could not be worked out, with the reason', async () => {
    const material = aSheetMaterial({ foundingLevel: -19 });
    expect(material.building.result.fault).not.toBeNull();
    const text = textOfPdf(await sheetDocument(material));
    expect(text).toContain('Not worked out');
    expect(text).toContain(material.building.result.fault?.slice(0, 40));
    expect(text).not.toContain('Breakpoint');
  });
});

test('long names and foreign letters stay inside, and what no font has is written out', async () => {
  const facts = { name: LONG, address: LONG, use: `Łódź Ωμέγα Кириллица 日 ${'x'.repeat(150)}` };
  const pdf = await sheetDocument(aSheetMaterial(facts, { scheme: { name: LONG } }));
  const text = textOfPdf(pdf);
  expect(text).toContain('Łódź Ωμέγα Кириллица [U+65E5]');
  expect(text.replaceAll(' ', '')).toContain('x'.repeat(150));
  expectInside(pdf);
});
