/** A level as people write it, with a comma or a true minus too; nothing or words are no level. */
export function levelOf(text: string): number | undefined {
  const plain = text.trim().replace(',', '.').replace('\u2212', '-');
  const level = plain === '' ? Number.NaN : Number(plain);
  return Number.isFinite(level) ? level : undefined;
}
