/**
 * A formula as a tree: what is added, what is multiplied over what it is divided by.
 *
 * Units: none. Valid: made by `parseExpression`. Source: [own].
 */
export type Expression =
  | { readonly kind: 'number'; readonly text: string }
  | { readonly kind: 'name'; readonly name: string }
  | { readonly kind: 'call'; readonly name: string; readonly given: readonly Expression[] }
  | { readonly kind: 'sum'; readonly terms: readonly Term[] }
  | {
      readonly kind: 'product';
      readonly over: readonly Expression[];
      readonly under: readonly Expression[];
    }
  | { readonly kind: 'power'; readonly base: Expression; readonly exponent: Expression }
  | {
      readonly kind: 'comparison';
      readonly sign: string;
      readonly left: Expression;
      readonly right: Expression;
    };

type Term = { readonly isTaken: boolean; readonly of: Expression };

const TOKENS = /\s*(\d+(?:\.\d+)?(?:e-?\d+)?|\p{L}[\p{L}\p{N}_]*|>=|<=|[-+*/^(),<>=])/uy;
const COMPARES = ['>=', '<=', '<', '>', '='];

function tokensOf(text: string): string[] {
  const tokens: string[] = [];
  const pattern = new RegExp(TOKENS);
  const trimmed = text.trimEnd();
  while (pattern.lastIndex < trimmed.length) {
    const token = pattern.exec(trimmed)?.[1];
    if (token === undefined) throw new Error(`No formula: ${text}`);
    tokens.push(token);
  }
  return tokens;
}

/** Reads tokens from the left; each method takes what is its own and leaves the rest. */
class Reader {
  readonly #tokens: readonly string[];
  #next = 0;

  constructor(tokens: readonly string[]) {
    this.#tokens = tokens;
  }

  get isAtEnd(): boolean {
    return this.#next === this.#tokens.length;
  }

  #take(...wanted: readonly string[]): string | undefined {
    const token = this.#tokens[this.#next];
    if (token === undefined || !wanted.includes(token)) return undefined;
    this.#next += 1;
    return token;
  }

  #close(): void {
    if (this.#take(')') === undefined) throw new Error('No formula: a bracket stays open.');
  }

  comparison(): Expression {
    const left = this.#sum();
    const sign = this.#take(...COMPARES);
    return sign === undefined ? left : { kind: 'comparison', sign, left, right: this.#sum() };
  }

  #sum(): Expression {
    const isTaken = this.#take('-') !== undefined;
    const terms: Term[] = [{ isTaken, of: this.#product() }];
    for (let sign = this.#take('+', '-'); sign !== undefined; sign = this.#take('+', '-')) {
      terms.push({ isTaken: sign === '-', of: this.#product() });
    }
    const [only] = terms;
    return terms.length === 1 && only !== undefined && !only.isTaken
      ? only.of
      : { kind: 'sum', terms };
  }

  #product(): Expression {
    const first = this.#power();
    const [over, under]: [Expression[], Expression[]] = [[first], []];
    for (let sign = this.#take('*', '/'); sign !== undefined; sign = this.#take('*', '/')) {
      const factor = this.#power();
      if (sign === '*') over.push(factor);
      else if (factor.kind === 'product' && factor.under.length === 0) under.push(...factor.over);
      else under.push(factor);
    }
    return over.length + under.length === 1 ? first : { kind: 'product', over, under };
  }

  #power(): Expression {
    const base = this.#atom();
    return this.#take('^') === undefined ? base : { kind: 'power', base, exponent: this.#atom() };
  }

  #atom(): Expression {
    if (this.#take('(') !== undefined) {
      const inner = this.comparison();
      this.#close();
      return inner;
    }
    const token = this.#tokens[this.#next] ?? '';
    this.#next += 1;
    if (/^\d/.test(token)) return { kind: 'number', text: token };
    if (this.#take('(') === undefined) return { kind: 'name', name: token };
    const given = [this.comparison()];
    while (this.#take(',') !== undefined) given.push(this.comparison());
    this.#close();
    return { kind: 'call', name: token, given };
  }
}

/**
 * Reads a formula in plain arithmetic, as workings write it.
 *
 * Units: none. Valid: throws where the text is no formula. Source: [own].
 */
export function parseExpression(text: string): Expression {
  const reader = new Reader(tokensOf(text));
  const expression = reader.comparison();
  if (!reader.isAtEnd) throw new Error(`No formula: ${text}`);
  return expression;
}

/**
 * What an expression is made of.
 *
 * Units: none. Valid: any expression. Source: [own].
 */
export function partsOf(expression: Expression): readonly Expression[] {
  switch (expression.kind) {
    case 'number':
    case 'name':
      return [];
    case 'call':
      return expression.given;
    case 'sum':
      return expression.terms.map((term) => term.of);
    case 'product':
      return [...expression.over, ...expression.under];
    case 'power':
      return [expression.base, expression.exponent];
    case 'comparison':
      return [expression.left, expression.right];
  }
}

/**
 * The names in a formula, each once, in the order in which they come.
 *
 * Units: none. Valid: any expression. Source: [own].
 */
export function namesIn(expression: Expression): readonly string[] {
  const own = expression.kind === 'name' ? [expression.name] : [];
  return [...new Set([...own, ...partsOf(expression).flatMap(namesIn)])];
}
