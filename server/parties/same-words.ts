import { foldedWords } from '../crs/folded-words.ts';

/** What is alike in texts that are written alike: their words; letters themselves where there are none. */
export function sameWords(text: string): string {
  const words = foldedWords(text).join(' ');
  return words === '' ? text.trim().toLowerCase() : words;
}
