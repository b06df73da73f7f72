import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { CATEGORIES } from '../../../../shared/damage/categories.ts';
import { DamageChip } from '../../../../src/components/ui/damage-chip.tsx';
import { HatchPatterns, hatchFill } from '../../../../src/components/ui/hatch-patterns.tsx';
import { StateMark } from '../../../../src/components/ui/state-mark.tsx';

describe('DamageChip', () => {
  it.each(CATEGORIES)(
    'says the number and name of category $label',
    ({ category, label, name }) => {
      const { container } = render(<DamageChip category={category} />);
      expect(container.textContent).toBe(`Category ${label}, ${name}`);
      expect(container.querySelector('i')?.style.backgroundImage).toContain('data:image/svg+xml');
    },
  );

  it('shows its name where there is room', () => {
    render(<DamageChip category={4} named />);
    expect(screen.getByText('severe to very severe').className).not.toContain('sr-only');
  });
});

describe('HatchPatterns', () => {
  it('hold one pattern a category under the names that shapes fill themselves with', () => {
    const { container } = render(
      <svg>
        <HatchPatterns prefix="chart" scale={0.8} />
      </svg>,
    );
    const names = [...container.querySelectorAll('pattern')].map(({ id }) => `url(#${id})`);
    expect(names).toEqual(CATEGORIES.map(({ category }) => hatchFill('chart', category)));
  });
});

describe('StateMark', () => {
  it.each([
    ['not-started', 'Not started'],
    ['in-hand', 'In hand'],
    ['waiting', 'Waiting for check'],
    ['visit', 'Visit needed'],
    ['done', 'Done'],
  ] as const)('%s has a shape and a word', (state, word) => {
    const { container } = render(<StateMark state={state} />);
    expect(container.textContent).toBe(word);
    expect(container.querySelector('svg')?.getAttribute('aria-hidden')).toBe('true');
  });

  it('takes the better word of the screen', () => {
    render(<StateMark state="in-hand">Invited until 3 May</StateMark>);
    expect(screen.getByText('Invited until 3 May')).toBeTruthy();
  });
});
