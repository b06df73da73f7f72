/**
 * How easily a text reads, by R. Flesch, "A new readability yardstick", Journal of Applied Psychology 32
 * (1948), 221–233: from the length of its sentences in words and of its words in syllables. 60 to 70 is plain
 * English. Syllables are counted by groups of vowels, so a figure for a few words only is rough; numerals
 * count as one syllable.
 */
export function readingEase(text: string): number {
  const sentences = text.split(/[.!?:]+(?=\s|$)/).filter((part) => /\p{L}/u.test(part)).length;
  const words = text.match(/[\p{L}\d][\p{L}\d’'-]*/gu) ?? [];
  if (sentences === 0) return 100;
  const syllables = words.reduce((sum, word) => sum + syllablesOf(word), 0);
  return 206.835 - (1.015 * words.length) / sentences - (84.6 * syllables) / words.length;
}

/** Written but not spoken, after what stands before it: "made", "whole", "used", "homes"; not "able". */
const SILENT = /(?<=[aeiouy]l|[^laeiouy])e$|(?<=[^aeiouydt])e(?=d$)|(?<=[^laeiouycsxz])e(?=s$)/;

/** How many syllables an English word has, about. */
function syllablesOf(word: string): number {
  const plain = word.toLowerCase().replaceAll(/[^a-z]/g, '');
  const spoken = plain.length > 3 ? plain.replace(SILENT, '') : plain;
  const groups = spoken.match(/[aeiouy]+/g)?.length ?? 1;
  // "area" and "being" have one more than their groups of vowels, "special" has not
  const more = spoken.match(/i[ao]|[ey]ing/g)?.length ?? 0;
  const fewer = spoken.match(/[cgst]i[ao]/g)?.length ?? 0;
  return Math.max(1, groups + more - fewer);
}
