const MOST = 2000;

/** Metres as people write them, with a comma or a true minus too; NaN where they cannot be meant. */
export function metresOf(text: string): number {
  const plain = text.trim().replace(',', '.').replace('\u2212', '-');
  const metres = plain === '' ? 0 : Number(plain);
  return Math.abs(metres) <= MOST ? metres : Number.NaN;
}
