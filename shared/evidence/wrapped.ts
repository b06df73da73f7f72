import type { Measure } from './marks.ts';

type Look = { readonly size: number; readonly isStrong?: boolean };

/**
 * Words in lines that are no wider than a width, broken at spaces; a word that is wider stands alone.
 *
 * Units: width mm, size points of print. Valid: never without a line. Source: [own].
 */
export function wrapped(
  words: string,
  width: number,
  measure: Measure,
  { size, isStrong = false }: Look,
): string[] {
  const lines: string[] = [];
  for (const word of words.split(/ +/)) {
    const longer = `${lines.at(-1) ?? ''} ${word}`;
    if (lines.length > 0 && measure(longer, size, isStrong) <= width)
      lines[lines.length - 1] = longer;
    else lines.push(word);
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
