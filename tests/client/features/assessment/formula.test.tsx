import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { FiguresPutIn, Formula } from '../../../../src/features/assessment/formula/formula.tsx';
import { namesIn, parseExpression } from '../../../../shared/presentation/parse-expression.ts';

function written(expression: string): string {
  render(<Formula symbol="r_b" expression={expression} />);
  return screen.getByLabelText(`r_b = ${expression}`).innerHTML;
}

describe('a formula', () => {
  it('knows the names in it, each once', () => {
    const expression = parseExpression(
      'ε_h * (1 - ν) / 2 + sqrt((ε_h * (1 + ν) / 2)^2 + (DL / r_d)^2)',
    );
    expect(namesIn(expression)).toEqual(['ε_h', 'ν', 'DL', 'r_d']);
  });

  it.each(['1 +', 'a b', 'a $ b', '(a'])('is refused where it is none: %s', (text) => {
    expect(() => parseExpression(text)).toThrow('No formula');
  });

  it('puts what is divided over what divides it, plain numbers first', () => {
    const html = written('L / (12 * t) + 3 * I / (2 * t * L * H) * EG');
    expect(html).toContain('<msub><mi>r</mi><mtext>b</mtext></msub>');
    expect(html.match(/<mfrac>/g)).toHaveLength(2);
    expect(html.indexOf('<mi>G</mi>')).toBeLessThan(html.lastIndexOf('<mn>2</mn>'));
  });

  it('keeps brackets where what is inside belongs together', () => {
    const html = written('(a / b)^2 - (c - d) * EG');
    expect(html.match(/\(<\/mo>/g)).toHaveLength(3);
  });

  it('with figures tells them apart by a sign', () => {
    render(<FiguresPutIn expression="V_L * pi * y^2" figures={{ V_L: 0.015, y: -2 }} />);
    const { textContent, innerHTML } = screen.getByLabelText('with V_L = 0.015, y = -2');
    expect(textContent).toContain('0.015');
    expect(textContent).toContain('(−2)');
    expect(innerHTML).toContain('×');
  });
});
