import { render } from '@testing-library/react';
import { expect, it } from 'vitest';
import { BracketLines } from '../../../../src/components/chart/bracket-lines.tsx';

it('a bracket is a band between a dotted low and a dashed high, with an inked line, broken where nothing is', () => {
  const at = (x: number) => ({ x, low: 1, central: 2, high: 4 });
  const { container } = render(
    <svg>
      <BracketLines places={[at(0), at(10), null, at(20), at(30)]} />
    </svg>,
  );
  const paths = [...container.querySelectorAll('path')].map((path) => [
    path.getAttribute('d'),
    path.getAttribute('stroke-dasharray'),
  ]);
  expect(paths.slice(0, 4)).toEqual([
    ['M0.0 1.0L10.0 1.0L10.0 4.0L0.0 4.0Z', null],
    ['M0.0 1.0L10.0 1.0', '1 3'],
    ['M0.0 4.0L10.0 4.0', '5 3'],
    ['M0.0 2.0L10.0 2.0', null],
  ]);
  expect(paths[7]?.[0]).toBe('M20.0 2.0L30.0 2.0');
  expect(paths).toHaveLength(8);
});
