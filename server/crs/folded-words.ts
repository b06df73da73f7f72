/** The words of a text for finding: small letters without accents, split where neither letters nor figures stand. */
export function foldedWords(text: string): string[] {
  return text
    .normalize('NFD')
    .replaceAll(/\p{M}+/gu, '')
    .toLowerCase()
    .split(/[^\p{L}\p{N}]+/u)
    .filter((word) => word !== '');
}
