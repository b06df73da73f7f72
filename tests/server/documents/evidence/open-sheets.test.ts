import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { CATEGORIES } from '../../../../shared/damage/categories.ts';
import { groundFrame } from '../../../../shared/evidence/ground-frame.ts';
import { cornersOf, lineMark, type Mark, type Tone } from '../../../../shared/evidence/marks.ts';
import { sheetLayout } from '../../../../shared/evidence/paper-sizes.ts';
import type { Sheet } from '../../../../shared/evidence/sheet.ts';
import { SETTLEMENT_TINTS, STAGE_TINTS } from '../../../../shared/presentation/ground-tints.ts';
import { openSheets } from '../../../../server/documents/evidence/open-sheets.ts';
import { linesOfPage } from '../../../support/drawn-lines.ts';
import { greyCopy, textureOf, type Texture } from '../../../support/grey-copy.ts';
import { bookmarksOfPdf, factsOfPdf, fontsOfPdf, textOfPdf, wordBoxesOfPdf } from '../../../support/pdf-tools.ts'; // prettier-ignore

const folder = mkdtempSync(path.join(tmpdir(), 'groundsill-sheets-'));
const FACTS = { title: 'Quay', author: 'Harbour line', subject: 'Run 1', at: new Date(0) };
const POINTS_PER_MM = 72 / 25.4;
let made = 0;

afterAll(() => {
  rmSync(folder, { recursive: true });
});

async function drawn(...sheets: Sheet[]): Promise<Uint8Array> {
  const file = path.join(folder, `${(made += 1)}.pdf`);
  const open = openSheets(file, FACTS);
  for (const sheet of sheets) await open.add(sheet);
  expect(await open.close()).toBe(sheets.length);
  return readFileSync(file);
}

function aSheet(marks: readonly Mark[], name = 'Sheet 1'): Sheet {
  return { name, width: 420, height: 297, marks };
}

test('pages have the size of their paper, and the document says what it is', async () => {
  const pdf = await drawn(
    aSheet([]),
    { ...aSheet([], 'Sheet 2'), width: 841, height: 594 },
    aSheet([], 'Sheet 3'),
  );
  const { Title, Author, Subject, Pages, ...facts } = factsOfPdf(pdf);
  expect([Title, Author, Subject, Pages]).toEqual(['Quay', 'Harbour line', 'Run 1', '3']);
  const [width, height] = (facts['Page size'] ?? '').match(/[\d.]+/g)?.map(Number) ?? [];
  expect(width).toBeCloseTo(420 * POINTS_PER_MM, 1);
  expect(height).toBeCloseTo(297 * POINTS_PER_MM, 1);
  expect(bookmarksOfPdf(pdf)).toEqual(['Sheet 1', 'Sheet 2', 'Sheet 3']);
});

test('words are embedded, can be read out, and stand where they should, turned or not', async () => {
  const pdf = await drawn(
    aSheet([
      { kind: 'words', words: 'Ufer 3 · Łódź ε', at: [100, 50], size: 8 },
      { kind: 'words', words: 'upright', at: [200, 150], size: 8, along: [0, -1] },
      { kind: 'words', words: 'ending', at: [300, 50], size: 8, anchor: 'end', isStrong: true },
    ]),
  );
  expect(textOfPdf(pdf)).toContain('Ufer 3 · Łódź ε');
  const fonts = fontsOfPdf(pdf);
  expect(fonts.length).toBeGreaterThan(1);
  expect(fonts.every(({ isEmbedded, isReadable }) => isEmbedded && isReadable)).toBe(true);
  const words = new Map(wordBoxesOfPdf(pdf).map((box) => [box.word, box]));
  const [first, upright, ending] = ['Ufer', 'upright', 'ending'].map((word) => words.get(word));
  expect((first?.left ?? 0) / POINTS_PER_MM).toBeCloseTo(100, 0);
  expect((ending?.right ?? 0) / POINTS_PER_MM).toBeCloseTo(300, 0);
  // up the paper from where it begins, to the left of the line that its letters stand on
  expect((upright?.bottom ?? 0) / POINTS_PER_MM).toBeCloseTo(150, 0);
  expect((upright?.left ?? 0) / POINTS_PER_MM).toBeLessThan(200);
});

test('a wall of known length is true to scale within 0.2 mm, turned and clipped as it may be', async () => {
  const { window } = sheetLayout('A3');
  const right = [0.8, 0.6] as const;
  const frame = groundFrame(window, { centre: [500_000, 6_080_000], denominator: 500, right });
  const wall = [[499_990, 6_079_995], [500_020, 6_080_035]] as const; // prettier-ignore
  const places = wall.map(frame.place);
  const stroke = { ink: 'ink', width: 0.25, dash: [2, 1] } as const;
  const pdf = await drawn(aSheet([{ kind: 'within', window, marks: [lineMark(places, stroke)] }]));
  const long = linesOfPage(pdf).map(({ start, end }) => Math.hypot(end[0] - start[0], end[1] - start[1]) / POINTS_PER_MM); // prettier-ignore
  // 50 m at 1 : 500
  expect(long.some((length) => Math.abs(length - 100) < 0.2)).toBe(true);
  const [x = 0, y = 0] = places[0] ?? [];
  const starts = linesOfPage(pdf).map(({ start }) => [start[0] / POINTS_PER_MM, 297 - start[1] / POINTS_PER_MM] as const); // prettier-ignore
  expect(starts.some(([left, top]) => Math.hypot(left - x, top - y) < 0.2)).toBe(true);
});

test('hatches are fixed to the sheet: what touches reads as one tone', async () => {
  const square = (left: number) => [[[left, 50], [left + 10, 50], [left + 10, 60], [left, 60]]] as const; // prettier-ignore
  const tone = { by: 'category', number: 1 } as const;
  const pdf = await drawn(
    aSheet([
      { kind: 'toned', tone, rings: square(50) },
      { kind: 'toned', tone, rings: square(60.3) },
    ]),
  );
  const rising = linesOfPage(pdf)
    .map(({ start, end }) => ({ start, end, rise: end[0] - start[0] - (end[1] - start[1]) }))
    .filter(({ start, end, rise }) => Math.abs(rise) < 1e-3 && start[0] !== end[0]);
  expect(rising.length).toBeGreaterThan(10);
  for (const { start } of rising) {
    const along = start[0] / POINTS_PER_MM + (297 - start[1] / POINTS_PER_MM);
    expect(Math.abs(along / 2.1 - Math.round(along / 2.1))).toBeLessThan(0.01);
  }
});

describe('a copy without colours', () => {
  /** A house of 10 m at 1 : 2500, apart from its edge. */
  const [HOUSE, EDGE] = [4, 0.3];

  async function texturesOf(tones: readonly Tone[], dotsPerInch: number): Promise<Texture[]> {
    const boxes = tones.map((_, k) => ({ left: 20 + 10 * k, top: 50, right: 20 + 10 * k + HOUSE, bottom: 50 + HOUSE })); // prettier-ignore
    const marks = tones.map((tone, k): Mark => ({ kind: 'toned', tone, rings: boxes.slice(k, k + 1).map(cornersOf) })); // prettier-ignore
    const copy = greyCopy(await drawn(aSheet(marks)), dotsPerInch);
    return boxes.map(
      ({ left, top, right, bottom }) =>
      textureOf(copy, { left: left + EDGE, top: top + EDGE, right: right - EDGE, bottom: bottom - EDGE }), // prettier-ignore
    );
  }

  /** By how much a patch is darker than the one before it, of 255. */
  function darkening(textures: readonly Texture[]): number[] {
    return textures.slice(1).map(({ light }, k) => (textures[k]?.light ?? NaN) - light);
  }

  // 141 dots an inch show what 200 do of A3 copied down to A4
  test.each([200, 141])(
    'at %i dots an inch tells categories by grey and by hatch',
    async (dots) => {
      const tones = CATEGORIES.map(({ category }): Tone => ({ by: 'category', number: category }));
      const textures = await texturesOf(tones, dots);
      for (const step of darkening(textures)) expect(step).toBeGreaterThan(20);
      // whether grey changes up to the right, and down to the right: strokes run where it does not
      const changes = textures.map(({ rising, falling }) => [rising > 10, falling > 10]);
      expect(changes).toEqual([
        [false, false],
        [false, true],
        [false, true],
        [true, true],
        [true, false],
      ]);
    },
  );

  test.each([
    ['stage', STAGE_TINTS],
    ['settlement', SETTLEMENT_TINTS],
  ] as const)('tells one %s from the next', async (by, tints) => {
    const textures = await texturesOf(tints.map(([number]) => ({ by, number })), 200); // prettier-ignore
    for (const step of darkening(textures)) expect(step).toBeGreaterThan(20);
  });
});
