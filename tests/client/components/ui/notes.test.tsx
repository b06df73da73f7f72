import { fireEvent, render, screen } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { EmptyState } from '../../../../src/components/ui/empty-state.tsx';
import { ErrorNote } from '../../../../src/components/ui/error-note.tsx';
import { Facts } from '../../../../src/components/ui/facts.tsx';
import { MutationError } from '../../../../src/components/ui/mutation-error.tsx';
import { Panel } from '../../../../src/components/ui/panel.tsx';
import { Progress } from '../../../../src/components/ui/progress.tsx';
import { QueryError } from '../../../../src/components/ui/query-error.tsx';
import { ApiError } from '../../../../src/lib/api-error.ts';
import { axeFaults } from '../../../support/axe-faults.ts';

const CONFLICT = new ApiError('already-exists', 'This is there already.', 409, [
  { path: 'email', message: 'Somebody has this address.' },
]);

describe('ErrorNote', () => {
  it('says what failed, what stands and what to do', () => {
    render(<ErrorNote failed="Run 42 stopped." stands="Run 41 still stands." action="Go on?" />);
    expect(screen.getByRole('alert').textContent).toBe(
      'Run 42 stopped. Run 41 still stands.Go on?',
    );
  });
});

describe('QueryError', () => {
  it('offers to try again', () => {
    const onRetry = vi.fn();
    render(<QueryError what="The list" error={new Error('x is not defined')} onRetry={onRetry} />);
    expect(screen.getByRole('alert').textContent).not.toContain('x is not defined');
    fireEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(onRetry).toHaveBeenCalledOnce();
  });
});

describe('MutationError', () => {
  it('is silent without an error and after a cancelled upload', () => {
    const cancelled = new DOMException('cancelled', 'AbortError');
    const { container } = render(
      <>
        <MutationError failed="Not saved." error={null} />
        <MutationError failed="Not saved." error={cancelled} />
      </>,
    );
    expect(container.textContent).toBe('');
  });

  it('says what no field says', () => {
    render(<MutationError failed="Nobody was invited." error={CONFLICT} />);
    expect(screen.getByRole('alert').textContent).toBe(
      'Nobody was invited. This is there already. Somebody has this address.',
    );
  });

  it('does not repeat what a field says', () => {
    render(<MutationError failed="Nobody was invited." error={CONFLICT} shown={['email']} />);
    expect(screen.getByRole('alert').textContent).toBe('Nobody was invited. Mend what is marked.');
  });
});

describe('EmptyState', () => {
  it('is one sentence and a first step', () => {
    render(<EmptyState action={<button>Bring in</button>}>No buildings yet.</EmptyState>);
    expect(screen.getByText('No buildings yet.')).toBeTruthy();
    expect(screen.getByRole('button')).toBeTruthy();
  });
});

describe('Progress', () => {
  it('is a figure that can be heard and stopped', async () => {
    const onCancel = vi.fn();
    const props = {
      label: 'Run 42',
      done: 1204,
      total: 2388,
      unit: 'buildings',
      left: '20 s left',
    };
    render(<Progress {...props} onCancel={onCancel} />);
    expect(screen.getByText('1 204 of 2 388 buildings, 50 %, 20 s left')).toBeTruthy();
    expect(screen.getByRole('progressbar', { name: 'Run 42' }).ariaValueNow).toBe('50');
    expect(await axeFaults()).toEqual([]);
    fireEvent.click(screen.getByRole('button', { name: 'Cancel' }));
    expect(onCancel).toHaveBeenCalledOnce();
  });

  it('does not divide by nothing', () => {
    render(<Progress label="Run 42" done={0} total={0} unit="buildings" />);
    expect(screen.getByText('0 of 0 buildings, 0 %')).toBeTruthy();
  });
});

describe('Panel', () => {
  it('is a region with its heading, its note and its way on', async () => {
    render(
      <Panel title="Port Dogger" note="you are an assessor" action={<a href="/x">Open</a>}>
        Inside
      </Panel>,
    );
    expect(screen.getByRole('region', { name: 'Port Dogger' }).textContent).toContain('Inside');
    expect(screen.getByRole('heading', { level: 2 }).textContent).toBe('Port Dogger');
    expect(await axeFaults()).toEqual([]);
  });
});

describe('Facts', () => {
  it('pair words with values', () => {
    render(<Facts facts={[['Axes', 'easting and northing']]} />);
    expect(screen.getByRole('term').textContent).toBe('Axes');
    expect(screen.getByRole('definition').textContent).toBe('easting and northing');
  });
});
