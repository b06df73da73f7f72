import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { unpackFont } from './unpack-font.ts';

const require = createRequire(import.meta.url);

export type Weight = 'regular' | 'strong';

const WEIGHTS: Readonly<Record<Weight, number>> = { regular: 400, strong: 600 };
/** In the order in which they are asked for a character; signs of formulas come in one weight. */
const SUBSETS = [
  'latin',
  'latin-ext',
  'greek',
  'math',
  'cyrillic',
  'cyrillic-ext',
  'greek-ext',
  'vietnamese',
  'devanagari',
] as const;

function fileOf(subset: (typeof SUBSETS)[number], weight: Weight): string {
  return subset === 'math'
    ? require.resolve('@fontsource/noto-sans-math/files/noto-sans-math-latin-400-normal.woff')
    : require.resolve(
        `@fontsource/noto-sans/files/noto-sans-${subset}-${WEIGHTS[weight]}-normal.woff`,
      );
}

/** Fonts that were unpacked once; they are a few megabytes in all, and every document wants them. */
const unpacked = new Map<string, Buffer>();

function fontOf(file: string): Buffer {
  const font = unpacked.get(file) ?? unpackFont(readFileSync(file));
  unpacked.set(file, font);
  return font;
}

/** The fonts that together hold the letters of a weight, by the name under which a document has them. */
export function fontsOf(
  weight: Weight,
): readonly { readonly name: string; readonly font: () => Buffer }[] {
  return SUBSETS.map((subset) => ({
    name: subset === 'math' ? subset : `${subset} ${weight}`,
    font: () => fontOf(fileOf(subset, weight)),
  }));
}
