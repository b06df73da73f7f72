/** Each is good up to and with so many millimetres. */
const EVERYDAY: readonly (readonly [upTo: number, words: string])[] = [
  [1, 'about as thick as a bank card'],
  [2.5, 'about as thick as a coin'],
  [5, 'about as thick as two coins'],
  [12, 'about as thick as a pencil'],
  [24, 'about as wide as a finger'],
  [36, 'about as wide as two fingers'],
  [60, 'about as long as a match'],
  [110, 'about as wide as a hand'],
  [200, 'about as long as a new pencil'],
];

const MORE = 'more than the length of a new pencil';

/**
 * A small length beside something from everyday life, as "about as thick as a pencil".
 *
 * Units: millimetres. Valid: 0 and more; a bank card is 0.8 thick, coins 1 to 3, a pencil 7, a finger 16 to
 * 20 wide, a match 45 long, a hand 85 wide, a new pencil 175 long, each good for what lies nearest to it.
 * Source: [own].
 */
export function everydayLength(millimetres: number): string {
  return EVERYDAY.find(([upTo]) => millimetres <= upTo)?.[1] ?? MORE;
}
