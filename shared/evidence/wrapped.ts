import type { Measure } from './marks.ts';

type Look = { readonly size: number; readonly isStrong?: boolean };

/** A word in pieces that are no wider than a width; a single letter is never cut. */
function piecesOf(word: string, isNarrow: (words: string) => boolean): string[] {
  if (isNarrow(word)) return [word];
  const pieces: string[] = [''];
  for (const letter of word) {
    const longer = `${pieces.at(-1) ?? ''}${letter}`;
    if (longer === letter || isNarrow(longer)) pieces[pieces.length - 1] = longer;
    else pieces.push(letter);
  }
  return pieces;
}

/**
 * Words in lines that are no wider than a width, broken at spaces; a word that is wider is broken where it
 * has to be.
 *
 * Units: width mm, size points of print. Valid: never without a line; a width of a letter or more.
 * Source: [own].
 */
export function wrapped(
  words: string,
  width: number,
  measure: Measure,
  { size, isStrong = false }: Look,
): string[] {
  const lines: string[] = [];
  const isNarrow = (line: string) => measure(line, size, isStrong) <= width;
  for (const word of words.split(/ +/)) {
    const longer = `${lines.at(-1) ?? ''} ${word}`;
    if (lines.length > 0 && isNarrow(longer)) lines[lines.length - 1] = longer;
    else lines.push(...piecesOf(word, isNarrow));
  }
  return lines;
}

/**
 * Words that fit into one line of a width, cut with an ellipsis where they are longer.
 *
 * Units: width mm, size points of print. Valid: any words. Source: [own].
 */
export function fitted(
  words: string,
  width: number,
  measure: Measure,
  { size, isStrong = false }: Look,
): string {
  if (measure(words, size, isStrong) <= width) return words;
  const letters = Array.from(words);
  while (letters.length > 0 && measure(`${letters.join('')}…`, size, isStrong) > width)
    letters.pop();
  return `${letters.join('').trimEnd()}…`;
}
