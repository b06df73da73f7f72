import { parseExpression, type Expression } from '../../../shared/presentation/parse-expression.ts';
import { formatSignificant } from '../../../shared/presentation/significant.ts';
import { symbolParts } from '../../../shared/presentation/symbol-parts.ts';
import type { Piece } from '../pdf/words.ts';

/** What stands in a formula in the place of names: their figures. */
type Figures = Readonly<Record<string, number>>;
type Pieces = readonly Piece[];

const DIGITS = 5;
const SIGNS: Readonly<Record<string, string>> = { '>=': '≥', '<=': '≤' };

/** Squares and cubes have signs of their own, so that they stay what they are when the text is copied out. */
const OWN_SIGNS: Readonly<Record<string, string>> = { '2': '²', '3': '³' };

function text(words: string): Piece {
  return { text: words };
}

function within(inner: Pieces, open = '(', close = ')'): Pieces {
  return [text(open), ...inner, text(close)];
}

/** A symbol as it stands in formulas. */
export function symbolPieces(name: string): Pieces {
  const parts = symbolParts(name);
  if (parts.kind === 'quotient') return [text(`${parts.over}/${parts.under}`)];
  const { letters, below } = parts;
  return [text(letters), ...(below === '' ? [] : [{ text: below, rise: 'under' } as const])];
}

/** What needs brackets beside a sign of multiplication. */
function isLoose(expression: Expression, figures: Figures | undefined): boolean {
  if (expression.kind === 'name') {
    const figure = figures?.[expression.name];
    return figure === undefined ? symbolParts(expression.name).kind === 'quotient' : figure < 0;
  }
  return expression.kind === 'sum' || expression.kind === 'comparison';
}

function factor(expression: Expression, figures: Figures | undefined): Pieces {
  const pieces = piecesOf(expression, figures);
  return isLoose(expression, figures) ? within(pieces) : pieces;
}

function times(all: readonly Expression[], figures: Figures | undefined): Pieces {
  return all.flatMap((one, k) => [...(k === 0 ? [] : [text(' × ')]), ...factor(one, figures)]);
}

function under(all: readonly Expression[], figures: Figures | undefined): Pieces {
  const [only] = all;
  if (all.length !== 1 || only === undefined) return within(times(all, figures));
  return only.kind === 'product' ? within(piecesOf(only, figures)) : factor(only, figures);
}

function sumPieces(
  { terms }: Extract<Expression, { kind: 'sum' }>,
  figures: Figures | undefined,
): Pieces {
  return terms.flatMap(({ isTaken, of }, k) => {
    const isNegative = of.kind === 'name' && (figures?.[of.name] ?? 0) < 0;
    const pieces = piecesOf(of, figures);
    const isSplit = of.kind === 'sum' || of.kind === 'comparison';
    const own = isSplit || (isNegative && k > 0) ? within(pieces) : pieces;
    if (k === 0) return isTaken ? [text('−'), ...own] : own;
    return [text(isTaken ? ' − ' : ' + '), ...own];
  });
}

function callPieces(
  { name, given }: Extract<Expression, { kind: 'call' }>,
  figures: Figures | undefined,
): Pieces {
  const inner = given.flatMap((one, k) => [
    ...(k === 0 ? [] : [text(', ')]),
    ...piecesOf(one, figures),
  ]);
  if (name === 'abs') return within(inner, '|', '|');
  if (name === 'sqrt') return [text('√'), ...within(inner)];
  if (name === 'sum') return [text('∑ '), ...inner];
  if (!name.endsWith('inv')) return [text(name), ...within(inner)];
  return [text(name.slice(0, -3)), { text: '−1', rise: 'over' }, ...within(inner)];
}

function powerPieces(
  { base, exponent }: Extract<Expression, { kind: 'power' }>,
  figures: Figures | undefined,
): Pieces {
  const pieces = piecesOf(base, figures);
  const isOne =
    base.kind === 'number' ||
    base.kind === 'call' ||
    (base.kind === 'name' && !isLoose(base, figures));
  const whole = exponent.kind === 'number' ? OWN_SIGNS[exponent.text] : undefined;
  const over =
    whole === undefined
      ? piecesOf(exponent, figures).map((piece): Piece => ({ ...piece, rise: 'over' }))
      : [text(whole)];
  return [...(isOne ? pieces : within(pieces)), ...over];
}

function piecesOf(expression: Expression, figures: Figures | undefined): Pieces {
  switch (expression.kind) {
    case 'number':
      return [text(expression.text)];
    case 'name': {
      const figure = figures?.[expression.name];
      return figure === undefined
        ? symbolPieces(expression.name)
        : [text(formatSignificant(figure, DIGITS))];
    }
    case 'sum':
      return sumPieces(expression, figures);
    case 'call':
      return callPieces(expression, figures);
    case 'power':
      return powerPieces(expression, figures);
    case 'comparison': {
      const { sign, left, right } = expression;
      return [
        ...piecesOf(left, figures),
        text(` ${SIGNS[sign] ?? sign} `),
        ...piecesOf(right, figures),
      ];
    }
    case 'product': {
      const over = times(expression.over, figures);
      return expression.under.length === 0
        ? over
        : [...over, text(' / '), ...under(expression.under, figures)];
    }
  }
}

/** A formula in one line of writing, with names or with the figures put into it. */
export function formulaPieces(expression: string, figures?: Figures): Pieces {
  return piecesOf(parseExpression(expression), figures);
}
