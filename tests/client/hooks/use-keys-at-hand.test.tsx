import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { KeyHelp } from '../../../src/config/keys-at-hand.ts';
import { useKeyHelp } from '../../../src/hooks/use-key-help.ts';
import { useKeysAtHand } from '../../../src/hooks/use-keys-at-hand.ts';

const OF_MAP: readonly KeyHelp[] = [{ keys: ['F'], does: 'Fit' }];
const OF_TABLE: readonly KeyHelp[] = [{ keys: ['J'], does: 'Next' }];

function Part({ help, active }: { readonly help: readonly KeyHelp[]; readonly active?: boolean }) {
  useKeyHelp(help, active);
  return null;
}

function Help() {
  return <output>{useKeysAtHand().map(({ does }) => does)}</output>;
}

describe('the keys at hand', () => {
  it('are those of what is on the screen, each once', () => {
    const { rerender } = render(
      <>
        <Help />
        <Part help={OF_MAP} />
        <Part help={OF_TABLE} />
        <Part help={OF_TABLE} />
      </>,
    );
    expect(screen.getByRole('status').textContent).toBe('FitNext');
    rerender(
      <>
        <Help />
        <Part help={OF_MAP} active={false} />
        <Part help={OF_TABLE} />
      </>,
    );
    expect(screen.getByRole('status').textContent).toBe('Next');
    rerender(<Help />);
    expect(screen.getByRole('status').textContent).toBe('');
  });
});
