import { describe, expect, it } from 'vitest';
import { openPaper } from '../../../../server/documents/pdf/paper.ts';
import { piecesOf } from '../../../../server/documents/pdf/words.ts';
import { wrapWords } from '../../../../server/documents/pdf/wrap-words.ts';

const AT = new Date('2026-12-02T09:00:00Z');
const PAPER = openPaper({ size: 'A4', title: 'T', author: 'A', subject: 'S', at: AT });
const LOOK = { size: 9 };

function linesOf(words: string, width: number) {
  return wrapWords(PAPER, words, LOOK, width);
}

function textOf(words: string, width: number): string[] {
  return linesOf(words, width).map(({ glyphs }) => glyphs.map(({ text }) => text).join(''));
}

describe('fonts', () => {
  function fontsOf(text: string): string[] {
    return PAPER.faces.runsOf(text, 'regular').map((run) => `${run.font}: ${run.text}`);
  }

  it('are chosen by what each can write', () => {
    expect(fontsOf('Δ/L ≥ 5')).toEqual([
      ...['greek regular: Δ', 'latin regular: /L ', 'math: ≥', 'latin regular:  5'],
    ]);
    expect(fontsOf('Łódź')).toEqual([
      'latin-ext regular: Ł',
      'latin regular: ód',
      'latin-ext regular: ź',
    ]);
  });

  it('never leave a sign out unseen', () => {
    expect(fontsOf('日')).toEqual(['latin regular: [U+65E5]']);
    expect(fontsOf('a\u2062b')).toEqual(['latin regular: ab']);
    for (const one of '≤≥→√∞∂∑−×·π') expect(fontsOf(one).join()).not.toContain('U+');
  });
});

describe('words', () => {
  it('go on in the next line between words, none wider than there is room', () => {
    const words = 'Over the whole range of volume loss and K this building stays in category 1.';
    const lines = linesOf(words, 120);
    expect(lines.length).toBeGreaterThan(2);
    for (const { width } of lines) expect(width).toBeLessThanOrEqual(120);
    expect(textOf(words, 120).join(' ')).toBe(words);
  });

  it('are cut where one is wider than the line, and break where they say so', () => {
    for (const { width } of linesOf('x'.repeat(90), 60)) expect(width).toBeLessThanOrEqual(60);
    expect(textOf('x'.repeat(90), 60).join('')).toBe('x'.repeat(90));
    expect(textOf('one\ntwo', 200)).toEqual(['one', 'two']);
    expect(textOf('', 200)).toEqual(['']);
  });

  it('set powers of ten above the line, and leave squares of units alone', () => {
    expect(piecesOf('2 × 10⁻⁵ m²')).toEqual([
      { text: '2 × 10' },
      { text: '−5', rise: 'over' },
      { text: ' m²' },
    ]);
  });
});
