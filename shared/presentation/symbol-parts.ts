/**
 * A symbol of the method as it is written: two letters one over the other, or letters with what stands
 * below the line, empty where nothing does.
 *
 * Units: none. Valid: made by `symbolParts`. Source: [own].
 */
export type SymbolParts =
  | { readonly kind: 'quotient'; readonly over: string; readonly under: string }
  | { readonly kind: 'letters'; readonly letters: string; readonly below: string };

/** Names that are written otherwise than their letters say; the first two are quotients. */
const QUOTIENTS: Readonly<Record<string, readonly [string, string]>> = {
  DL: ['Δ', 'L'],
  EG: ['E', 'G'],
};
const LETTERS: Readonly<Record<string, string>> = { pi: 'π' };

/**
 * A name of a working as it is written: what follows its underscore, or the digit at its end, stands below
 * the line.
 *
 * Units: none. Valid: any name. Source: [own].
 */
export function symbolParts(name: string): SymbolParts {
  const quotient = QUOTIENTS[name];
  if (quotient !== undefined) {
    const [over, under] = quotient;
    return { kind: 'quotient', over, under };
  }
  const [, base = name, under, digit] = /^([^_]+?)(?:_(.+)|(\d))$/.exec(name) ?? [];
  const below = under ?? digit;
  if (below === undefined) return { kind: 'letters', letters: LETTERS[name] ?? name, below: '' };
  return { kind: 'letters', letters: base, below: below.replaceAll('_', ' ') };
}
