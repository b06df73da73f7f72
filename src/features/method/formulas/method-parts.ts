import { namesIn, parseExpression } from '../../../../shared/presentation/parse-expression.ts';
import { SYMBOL_WORDS, type SymbolWords } from '../../../../shared/presentation/symbol-words.ts';
import { ANSWER_PARTS } from './answer-parts.ts';
import { formulasOfWorkings } from './example-lines.ts';
import type { MethodPart } from './formula-parts.ts';
import { groundParts } from './ground-parts.ts';
import { wallParts } from './wall-parts.ts';

/** All parts of the method in the order of the work. */
export function methodParts(): readonly MethodPart[] {
  const take = formulasOfWorkings();
  return [...groundParts(take), ...wallParts(take), ...ANSWER_PARTS];
}

/** The symbols that the formulas of a part are written in, in the order in which they come. */
export function symbolsOf({
  formulas,
}: MethodPart): readonly (SymbolWords & { readonly symbol: string })[] {
  const names = formulas.flatMap(({ expression }) => namesIn(parseExpression(expression)));
  return [...new Set(names)].flatMap((symbol) => {
    const words = SYMBOL_WORDS[symbol];
    return words === undefined ? [] : [{ symbol, ...words }];
  });
}
