const WORDS = [
  'no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten', 'eleven',
  'twelve',
]; // prettier-ignore

/** A small count as a word, a large one in figures. */
export function countInWords(count: number): string {
  return WORDS[count] ?? String(count);
}
