import { createElement, type ReactNode } from 'react';
import { nameNode, nodeOf, type Figures } from './mathml.ts';
import './formula.css';
import { parseExpression } from '../../../../shared/presentation/parse-expression.ts';

function typeset(words: string, inner: ReactNode): ReactNode {
  const row = createElement('mrow', {}, inner);
  return createElement(
    'math',
    { 'aria-label': words, alttext: words, className: 'formula', displaystyle: 'true' },
    row,
  );
}

/** A symbol as it stands in formulas. */
export function SymbolName({ name }: { readonly name: string }) {
  return createElement(
    'math',
    { 'aria-label': name, alttext: name, className: 'formula' },
    nameNode(name),
  );
}

type FormulaProps = {
  readonly symbol: string;
  readonly expression: string;
};

/** A formula, typeset; who hears it hears it in plain arithmetic. */
export function Formula({ symbol, expression }: FormulaProps) {
  const equals = createElement('mo', {}, '=');
  const right = nodeOf(parseExpression(expression));
  return typeset(
    `${symbol} = ${expression}`,
    createElement('mrow', {}, nameNode(symbol), equals, right),
  );
}

/** The right side of a formula with figures in the place of its names. */
export function FiguresPutIn({
  expression,
  figures,
}: {
  readonly expression: string;
  readonly figures: Figures;
}) {
  const words = Object.entries(figures).map(([name, figure]) => `${name} = ${figure}`);
  const equals = createElement('mo', { form: 'prefix' }, '=');
  const right = nodeOf(parseExpression(expression), figures);
  return typeset(`with ${words.join(', ')}`, createElement('mrow', {}, equals, right));
}
