/**
 * Words as they begin a line.
 *
 * Units: none. Valid: any text. Source: [own].
 */
export function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
