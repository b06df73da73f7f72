import { createElement, type ReactNode } from 'react';
import { symbolParts } from '../../../../shared/presentation/symbol-parts.ts';
import { formatSignificant } from '../../../../shared/presentation/significant.ts';
import { partsOf, type Expression } from '../../../../shared/presentation/parse-expression.ts';

/** What stands in a formula in the place of names: their figures. */
export type Figures = Readonly<Record<string, number>>;

const FIGURE_DIGITS = 5;
const INVISIBLE_TIMES = '\u2062';
const THIN = '0.17em';

function element(tag: string, props: Record<string, string>, ...children: ReactNode[]): ReactNode {
  return createElement(tag, props, ...children);
}

function row(...children: ReactNode[]): ReactNode {
  return element('mrow', {}, ...children);
}

function sign(text: string, props: Record<string, string> = {}): ReactNode {
  return element('mo', props, text);
}

/** Whether something stands over something else in it, so that what is about it has to grow. */
function isTall(expression: Expression): boolean {
  const isQuotient = expression.kind === 'product' && expression.under.length > 0;
  return isQuotient || partsOf(expression).some(isTall);
}

function within(of: Expression, inner: ReactNode, open = '(', close = ')'): ReactNode {
  const stretchy = { stretchy: String(isTall(of)) };
  return row(sign(open, stretchy), inner, sign(close, stretchy));
}

function letters(text: string): ReactNode {
  const isWord = /.{2}/u.test(text);
  return isWord ? element('mtext', {}, text) : element('mi', {}, text);
}

/** A name with what follows its underscore, or the digit at its end, set below the line. */
export function nameNode(name: string): ReactNode {
  const parts = symbolParts(name);
  if (parts.kind === 'quotient') {
    return row(letters(parts.over), sign('/', { lspace: '0', rspace: '0' }), letters(parts.under));
  }
  if (parts.below === '') return letters(parts.letters);
  return element('msub', {}, letters(parts.letters), element('mtext', {}, parts.below));
}

/** A sum among factors stands in brackets, and so does a quotient written in one line. */
function isLoose(expression: Expression, figures: Figures | undefined): boolean {
  if (expression.kind === 'name') {
    const figure = figures?.[expression.name];
    return figure === undefined ? symbolParts(expression.name).kind === 'quotient' : figure < 0;
  }
  return expression.kind === 'sum' || expression.kind === 'comparison';
}

function factor(expression: Expression, figures: Figures | undefined): ReactNode {
  const node = nodeOf(expression, figures);
  return isLoose(expression, figures) ? within(expression, node) : node;
}

/** What is raised to a power stands in brackets unless it is one thing. */
function baseOf(expression: Expression, figures: Figures | undefined): ReactNode {
  const isOne = ['number', 'name', 'call'].includes(expression.kind);
  return isOne ? factor(expression, figures) : within(expression, nodeOf(expression, figures));
}

function isFigure(expression: Expression | undefined, figures: Figures | undefined): boolean {
  if (expression?.kind === 'name') return figures?.[expression.name] !== undefined;
  if (expression?.kind === 'power') return isFigure(expression.base, figures);
  return expression?.kind === 'number';
}

function factors(all: readonly Expression[], figures: Figures | undefined): ReactNode {
  const [only] = all;
  if (all.length === 1 && only !== undefined) return nodeOf(only, figures);
  const parts = all.flatMap((one, index) => {
    const node = factor(one, figures);
    if (index === 0) return [node];
    // figures side by side would read as one
    const times = isFigure(one, figures)
      ? sign('×')
      : sign(INVISIBLE_TIMES, { lspace: THIN, rspace: '0' });
    return [times, node];
  });
  return row(...parts);
}

/** Plain numbers come first, as they are written by hand. */
function numbersFirst(all: readonly Expression[]): readonly Expression[] {
  const isNumber = ({ kind }: Expression) => kind === 'number';
  return [...all.filter(isNumber), ...all.filter((one) => !isNumber(one))];
}

function sumNode(
  { terms }: Extract<Expression, { kind: 'sum' }>,
  figures: Figures | undefined,
): ReactNode {
  const parts = terms.flatMap(({ isTaken, of }, index) => {
    const needsBrackets = of.kind === 'sum' || (isLoose(of, figures) && isFigure(of, figures));
    const node = needsBrackets ? within(of, nodeOf(of, figures)) : nodeOf(of, figures);
    if (index === 0) return isTaken ? [sign('−', { form: 'prefix' }), node] : [node];
    return [sign(isTaken ? '−' : '+', { form: 'infix' }), node];
  });
  return row(...parts);
}

function callNode(
  call: Extract<Expression, { kind: 'call' }>,
  figures: Figures | undefined,
): ReactNode {
  const { name, given } = call;
  const inner = given.flatMap((one, index) => {
    const node = nodeOf(one, figures);
    return index === 0 ? [node] : [sign(',', { separator: 'true' }), node];
  });
  if (name === 'sqrt') {
    // without a font for formulas the sign of a root does not grow with what is under it
    return isTall(call)
      ? row(sign('√'), within(call, row(...inner)))
      : element('msqrt', {}, ...inner);
  }
  if (name === 'abs') return within(call, row(...inner), '|', '|');
  if (name === 'sum') return row(sign('∑'), ...inner);
  const isInverse = name.endsWith('inv');
  const head = element('mi', { mathvariant: 'normal' }, isInverse ? name.slice(0, -3) : name);
  const power = row(sign('−', { form: 'prefix' }), element('mn', {}, '1'));
  return row(isInverse ? element('msup', {}, head, power) : head, within(call, row(...inner)));
}

const SIGNS: Readonly<Record<string, string>> = { '>=': '≥', '<=': '≤' };

/** A formula, or the figures put into it, as nodes of MathML. */
export function nodeOf(expression: Expression, figures?: Figures): ReactNode {
  switch (expression.kind) {
    case 'number':
      return element('mn', {}, expression.text);
    case 'name': {
      const figure = figures?.[expression.name];
      if (figure === undefined) return nameNode(expression.name);
      return element('mn', {}, formatSignificant(figure, FIGURE_DIGITS));
    }
    case 'sum':
      return sumNode(expression, figures);
    case 'call':
      return callNode(expression, figures);
    case 'product': {
      const over = factors(expression.over, figures);
      if (expression.under.length === 0) return over;
      return element('mfrac', {}, over, factors(numbersFirst(expression.under), figures));
    }
    case 'power':
      return element(
        'msup',
        {},
        baseOf(expression.base, figures),
        nodeOf(expression.exponent, figures),
      );
    case 'comparison': {
      const { sign: written, left, right } = expression;
      return row(nodeOf(left, figures), sign(SIGNS[written] ?? written), nodeOf(right, figures));
    }
  }
}
