import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fitted, wrapped } from '../../../shared/evidence/wrapped.ts';
import { evenMeasure } from '../../support/plan-material.ts';
import { holds, numbers } from '../../support/property.ts';

const SIZE = { size: 8 };
const widths = numbers(15, 80);
const sentences = fc
  .array(fc.string({ minLength: 1, maxLength: 8 }).filter((word) => !/\s/.test(word)), {
    minLength: 1,
    maxLength: 30,
  })
  .map((words) => words.join(' ')); // prettier-ignore

describe('wrapped', () => {
  it('keeps all words in their order, in lines that fit', () => {
    holds(fc.tuple(sentences, widths), ([words, width]) => {
      const lines = wrapped(words, width, evenMeasure, SIZE);
      expect(lines.join(' ')).toBe(words);
      for (const line of lines) expect(evenMeasure(line, 8, false)).toBeLessThanOrEqual(width);
    });
  });

  it('takes as few lines as the words allow', () => {
    holds(fc.tuple(sentences, widths), ([words, width]) => {
      const lines = wrapped(words, width, evenMeasure, SIZE);
      for (const [k, line] of lines.slice(1).entries()) {
        const longer = `${lines[k] ?? ''} ${line.split(' ')[0] ?? ''}`;
        expect(evenMeasure(longer, 8, false)).toBeGreaterThan(width);
      }
    });
  });

  it('breaks a word that is wider than a line', () => {
    const word = 'Rindfleischetikettierung'.repeat(4);
    const lines = wrapped(`At ${word} now`, 30, evenMeasure, SIZE);
    expect(lines.join('').replaceAll(' ', '')).toBe(`At${word}now`);
    for (const line of lines) expect(evenMeasure(line, 8, false)).toBeLessThanOrEqual(30);
  });

  it('has one line of nothing where there are no words', () => {
    expect(wrapped('', 30, evenMeasure, SIZE)).toEqual(['']);
  });
});

describe('fitted', () => {
  it('leaves words that fit as they are', () => {
    expect(fitted('3 Cable Street', 60, evenMeasure, SIZE)).toBe('3 Cable Street');
  });

  it('cuts others as late as it can', () => {
    holds(fc.tuple(sentences, widths), ([words, width]) => {
      const found = fitted(words, width, evenMeasure, SIZE);
      expect(evenMeasure(found, 8, false)).toBeLessThanOrEqual(width);
      if (found === words) return;
      expect(found.endsWith('…')).toBe(true);
      const kept = found.slice(0, -1);
      expect(words.startsWith(kept)).toBe(true);
      const more = Array.from(words)
        .slice(0, Array.from(kept).length + 2)
        .join('');
      expect(evenMeasure(`${more}…`, 8, false)).toBeGreaterThan(width);
    });
  });
});
