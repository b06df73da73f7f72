import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { ALL_CHECKS } from '../../../../shared/checks/all-checks.ts';
import { checkRow, type Check } from '../../../../shared/checks/check.ts';
import { ChecksSection } from '../../../../src/features/method/components/checks-section.tsx';
import { MethodPage } from '../../../../src/features/method/method-page.tsx';
import { runChecks } from '../../../../src/features/method/checks/run-checks.ts';
import { renderPage } from '../../../support/render-page.tsx';

const BROKEN: Check = {
  id: 'broken',
  name: 'A formula that is 1 % wrong',
  source: 'burland-1995',
  provenance: 'made up',
  run: () => [
    checkRow('strain', '%', 0.0379, 0.0383, 0.00005),
    checkRow('start', 'm', 8, NaN, 0.5),
  ],
};

/** A thread that runs the checks it is given when it is asked to, or fails. */
function fakeThread(checks: readonly Check[] | null): { asked: number } {
  const seen = { asked: 0 };
  class FakeWorker extends EventTarget {
    postMessage(): void {
      seen.asked += 1;
      queueMicrotask(() => {
        const done = checks && runChecks(checks, () => 0);
        this.dispatchEvent(done ? new MessageEvent('message', { data: done }) : new Event('error'));
      });
    }
    terminate(): void {
      return undefined;
    }
  }
  vi.stubGlobal('Worker', FakeWorker);
  return seen;
}

describe('the checks', () => {
  it('all agree, each figure beside what is published', async () => {
    fakeThread(ALL_CHECKS);
    renderPage(<ChecksSection />);
    const rows = ALL_CHECKS.flatMap(({ run }) => run());
    expect(await screen.findByText(`${rows.length} of ${rows.length} agree`)).toBeTruthy();
    for (const { name, run } of ALL_CHECKS) {
      const names = run().map(({ what }) => what);
      expect(new Set(names).size).toBe(names.length);
      expect(within(screen.getByRole('table', { name })).getAllByText('agrees')).toHaveLength(
        names.length,
      );
    }
  });

  it('say plainly where one differs', async () => {
    fakeThread([BROKEN]);
    renderPage(<ChecksSection />);
    expect(await screen.findByText('0 of 2 agree', { selector: 'b' })).toBeTruthy();
    expect(screen.getByText(/2 differ: do not rely on this version/)).toBeTruthy();
    const table = within(screen.getByRole('table', { name: BROKEN.name }));
    expect(table.getAllByText('differs')).toHaveLength(2);
    expect(table.getByText('0.038300')).toBeTruthy();
    expect(table.getByText('no number')).toBeTruthy();
  });

  it('run again on demand', async () => {
    const seen = fakeThread([BROKEN]);
    renderPage(<ChecksSection />);
    await screen.findByText('0 of 2 agree', { selector: 'b' });
    fireEvent.click(screen.getByRole('button', { name: 'Run again' }));
    await waitFor(() => {
      expect(seen.asked).toBe(2);
    });
  });

  it('that do not run are no checks that agree', async () => {
    fakeThread(null);
    renderPage(<ChecksSection />);
    expect(await screen.findByText('The checks did not run.')).toBeTruthy();
    expect(screen.queryByText(/agree/)).toBeNull();
  });
});

describe('the page', () => {
  beforeEach(() => {
    fakeThread([]);
  });

  it('has formulas with their sources, and says which have none', () => {
    renderPage(<MethodPage />);
    expect(screen.getByLabelText('V_s = V_L * pi * D^2 / 4')).toBeTruthy();
    expect(screen.getAllByText('common practice, no source').length).toBeGreaterThan(0);
    expect(screen.getAllByText('worked out here').length).toBeGreaterThan(0);
    expect(screen.getByText(/set down from memory and are to be confirmed/)).toBeTruthy();
  });

  it('has categories, warnings, what it does not know, and cautions', () => {
    renderPage(<MethodPage />);
    expect(screen.getByText('0.15 % to under 0.3 %')).toBeTruthy();
    expect(screen.getByText('flat along the wall')).toBeTruthy();
    expect(screen.getByText('The stiffness of the building')).toBeTruthy();
    expect(screen.getByText(/does not replace a visit/)).toBeTruthy();
  });
});
