import { foldedWords } from '../crs/folded-words.ts';

type Column = { readonly name: string; readonly filled: number };

const EXACT = 200;
const PART = 80;
/** Shorter words turn up in names of everything. */
const LEAST_PART = 5;

/** eavesHeight, EAVES_HEIGHT and eaves:height are the words eaves and height. */
function wordsOf(name: string): string[] {
  return foldedWords(name.replaceAll(/(\p{Ll})(\p{Lu})/gu, '$1 $2'));
}

/** How sure a column's name speaks of a field; 0 not at all. */
function score(column: string, aliases: readonly string[]): number {
  const words = wordsOf(column);
  const [spaced, joined] = [` ${words.join(' ')} `, words.join('')];
  const scores = aliases.map((alias, index) => {
    if (joined === alias.replaceAll(' ', '')) return EXACT - index;
    const isPart = alias.length >= LEAST_PART && spaced.includes(` ${alias} `);
    return isPart ? PART - index - 5 * words.length : 0;
  });
  return Math.max(0, ...scores);
}

/** Which column fills which field, guessed by its name; empty columns fill none. */
export function guessByWords<Field extends string>(
  columns: readonly Column[],
  fields: readonly Field[],
  aliases: Readonly<Record<Field, readonly string[]>>,
): Partial<Record<Field, string>> {
  const guesses = columns
    .filter(({ filled }) => filled > 0)
    .flatMap(({ name }) =>
      fields.map((field) => ({ field, column: name, score: score(name, aliases[field]) })),
    )
    .filter((guess) => guess.score > 0)
    .sort((a, b) => b.score - a.score);
  const [chosen, used]: [Partial<Record<Field, string>>, Set<string>] = [{}, new Set()];
  for (const { field, column } of guesses) {
    if (chosen[field] !== undefined || used.has(column)) continue;
    chosen[field] = column;
    used.add(column);
  }
  return chosen;
}
