import { describe, expect, test } from 'vitest';
import type {
  LetterOnPaper,
  LettersMaterial,
} from '../../../../server/documents/letter/letter-material.ts';
import { lettersDocument } from '../../../../server/documents/letter/letters-document.ts';
import { fontsOfPdf, pagesOfPdf, textOfPdf, wordBoxesOfPdf } from '../../../support/pdf-tools.ts';

const POINTS_PER_MM = 72 / 25.4;

/** Names that people have or make up: the other way round, with pictures, without end. */
const HOSTILE = [
  'مالك البيت رقم ٩',
  'Ada 🏠 Hopper',
  `Freeholder ${'of a very long name '.repeat(14)}`.slice(0, 300),
  'W'.repeat(300),
  '<b>{cautions}</b> =cmd()',
];

const LINK: Exclude<LetterOnPaper['parts'][number], string> = { link: 'Open your page' };

function aLetter(overrides: Partial<LetterOnPaper> = {}): LetterOnPaper {
  return {
    mark: '3-1',
    name: 'Ada Hopper',
    address: '9 Fishgate\nPort Dogger',
    subject: 'A new tunnel near your home',
    parts: ['Dear Ada Hopper,', { list: ['9 Fishgate'] }, LINK],
    ...overrides,
  };
}

function material(letters: readonly LetterOnPaper[], hasManifest = false): LettersMaterial {
  return {
    schemeName: 'Port Dogger crossing',
    sender: ['The owners’ line', '1 Custom House Quay', 'owners@example.org'],
    day: '2 December 2026',
    page: 'http://127.0.0.1:4600/schemes/1/home',
    letters,
    hasManifest,
  };
}

describe('a letter on paper', () => {
  test('has name and address where the window of the envelope is, and its fonts with it', async () => {
    const pdf = await lettersDocument(material([aLetter()]));
    const boxes = wordBoxesOfPdf(pdf);
    const window = boxes.filter(({ word }) => ['Hopper', 'Fishgate', 'Dogger'].includes(word));
    const shown = window.filter(
      ({ left, top, right, bottom }) =>
        left >= 25 * POINTS_PER_MM - 1 &&
        top >= 50 * POINTS_PER_MM - 1 &&
        right <= 105 * POINTS_PER_MM &&
        bottom <= 82 * POINTS_PER_MM,
    );
    expect(shown.map(({ word }) => word)).toEqual(['Hopper', 'Fishgate', 'Dogger']);
    for (const font of fontsOfPdf(pdf)) expect(font).toMatchObject({ isEmbedded: true, isReadable: true }); // prettier-ignore
    expect(textOfPdf(pdf)).toContain('http://127.0.0.1:4600/schemes/1/home');
    expect(textOfPdf(pdf)).toContain('Letter 3-1, page 1 of 1');
  });

  test.each(HOSTILE)('holds whatever somebody is called: %s', async (name) => {
    const pdf = await lettersDocument(material([aLetter({ name, parts: [`Dear ${name},`] })]));
    const inWindow = wordBoxesOfPdf(pdf).filter(
      ({ top, left }) => top > 49 * POINTS_PER_MM && top < 90 * POINTS_PER_MM && left < 300,
    );
    for (const { right, bottom } of inWindow) {
      expect(right).toBeLessThanOrEqual(106 * POINTS_PER_MM);
      expect(bottom).toBeLessThanOrEqual(84 * POINTS_PER_MM);
    }
    expect(pagesOfPdf(pdf)).toHaveLength(1);
  });

  test('says its marks and tags as they are written, for a name is no order', async () => {
    const [, , , , name = ''] = HOSTILE;
    const pdf = await lettersDocument(material([aLetter({ name, parts: [`Dear ${name},`] })]));
    expect(textOfPdf(pdf)).toContain('Dear <b>{cautions}</b> =cmd(),');
  });

  test('goes on over pages where it is long, each numbered', async () => {
    const parts = Array.from({ length: 60 }, (_, k) => `Paragraph ${k + 1}. It says something.`);
    const pages = pagesOfPdf(await lettersDocument(material([aLetter({ parts })])));
    expect(pages.length).toBeGreaterThan(1);
    for (const [k, page] of pages.entries()) {
      expect(page).toContain(`Letter 3-1, page ${k + 1} of ${pages.length}`);
    }
    expect(pages.at(-1)).toContain('Paragraph 60.');
  });
});

test('letters for the post come in one file behind a list of them with their pages', async () => {
  const long = Array.from({ length: 60 }, (_, k) => `Paragraph ${k + 1}. It says something.`);
  const letters = [
    aLetter({ mark: '3-1' }),
    aLetter({ mark: '3-2', name: 'Bea Lime', parts: long }),
  ];
  const [manifest = '', ...pages] = pagesOfPdf(await lettersDocument(material(letters, true)));
  expect(manifest).toContain(`2 letters for the post, ${pages.length} pages`);
  expect(manifest).toMatch(/3-1\s+Ada Hopper\s+9 Fishgate, Port Dogger\s+1/);
  expect(manifest).toMatch(new RegExp(`3-2\\s+Bea Lime.*\\s${pages.length - 1}\\s`));
});
