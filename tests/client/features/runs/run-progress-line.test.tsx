import { fireEvent, screen, waitFor } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { RunProgressLine } from '../../../../src/features/runs/components/run-progress-line.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { fakeEventSource } from '../../../support/fake-event-source.ts';
import { renderPage } from '../../../support/render-page.tsx';
import { aRunAnswer, aRunDetail } from '../../../support/run-answers.ts';

const RUNS = `/api/schemes/${anId(10)}/runs`;
const UNDER_WAY: Partial<RunAnswer> = { state: 'running', done: 50, isShown: false, endedAt: null };
const STANDING = aRunAnswer();

/** The second run, not complete. */
function second(overrides: Partial<RunAnswer> = {}): RunAnswer {
  return aRunAnswer({ id: anId(61), number: 2, ...UNDER_WAY, ...overrides });
}

function openLine(runs: () => unknown, more = {}, abilities: SchemeAnswer['abilities'] = {}) {
  const api = fakeApi({ 'GET /api/session': undefined, [`GET ${RUNS}`]: runs, ...more });
  const stream = fakeEventSource();
  const scheme = aSchemeAnswer({ abilities: { readRuns: true, startRuns: true, ...abilities } });
  renderPage(
    <SchemeContext value={scheme}>
      <main>
        <h1>Plan</h1>
        <RunProgressLine>Nothing to say</RunProgressLine>
      </main>
    </SchemeContext>,
  );
  return { ...api, ...stream };
}

describe('a run under way', () => {
  it('is told of as it goes, and what it found once it is complete', async () => {
    let listed = [second(), STANDING];
    const counted = aRunDetail({ ...second({ state: 'complete', done: 200 }) });
    const { tell, opened, isClosed } = openLine(() => listed, {
      [`GET ${RUNS}/${anId(61)}`]: counted,
    });
    await screen.findByText('50 of 200 buildings, 25 %');
    expect(opened()).toEqual([`${RUNS}/${anId(61)}/progress`]);
    tell({ state: 'running', done: 122, buildings: 200, fault: null });
    await screen.findByText('122 of 200 buildings, 61 %');
    expect(await axeFaults()).toEqual([]);
    listed = [second({ state: 'complete', done: 200, isShown: true }), STANDING];
    tell({ state: 'complete', done: 200, buildings: 200, fault: null });
    await screen.findByText(/2 in category 0, 2 in category 1/);
    expect(isClosed()).toBe(true);
    fireEvent.click(screen.getByRole('button', { name: 'Close' }));
    await screen.findByText('Nothing to say');
  });

  it('is asked for where nothing is told any more', async () => {
    let done = 50;
    const { breakOff } = openLine(() => [second({ done })]);
    await screen.findByText('50 of 200 buildings, 25 %');
    done = 60;
    breakOff();
    await screen.findByText('60 of 200 buildings, 30 %', undefined, { timeout: 10_000 });
  });

  it('is cancelled, and goes on from there', async () => {
    let listed = [second(), STANDING];
    const { calls, opened } = openLine(() => listed, {
      [`POST ${RUNS}/${anId(61)}/cancel`]: () => {
        listed = [second({ state: 'cancelled', done: 123 }), STANDING];
        return listed[0];
      },
      [`POST ${RUNS}/${anId(61)}/resume`]: () => {
        listed = [second({ done: 123 }), STANDING];
        return listed[0];
      },
    });
    fireEvent.click(await screen.findByRole('button', { name: 'Cancel' }));
    await screen.findByText('Run 2 stopped at 61 %. Run 1 still stands. Go on from 61 %?');
    expect(await axeFaults()).toEqual([]);
    fireEvent.click(screen.getByRole('button', { name: 'Go on' }));
    await screen.findByText('123 of 200 buildings, 61 %');
    await waitFor(() => {
      expect(opened()).toHaveLength(2);
    });
    const sent = calls.filter(({ route }) => route.startsWith('POST'));
    expect(sent.map(({ route }) => route.split('/').at(-1))).toEqual(['cancel', 'resume']);
  });
});

describe('a run that stopped', () => {
  it('says why, and why it cannot go on', async () => {
    const failed = second({ state: 'failed', fault: 'The thread ended.' });
    openLine(() => [failed], {
      [`POST ${RUNS}/${anId(61)}/resume`]: new Refusal(409, 'conflict', 'Start a new run.'),
    });
    await screen.findByText('Run 2 stopped at 25 %: The thread ended. Go on from 25 %?');
    fireEvent.click(screen.getByRole('button', { name: 'Go on' }));
    await screen.findByText(/Start a new run\./);
  });

  it('is only told of to who may not run', async () => {
    openLine(() => [second({ state: 'cancelled' })], {}, { startRuns: false });
    await screen.findByText('Run 2 stopped at 25 %.');
    expect(screen.queryByRole('button')).toBeNull();
  });
});

it('who may not read runs asks for none', () => {
  const { calls } = openLine(() => [], {}, { readRuns: false });
  expect(screen.getByText('Nothing to say')).toBeTruthy();
  expect(calls).toEqual([]);
});

it('a list that does not come says so', async () => {
  openLine(() => new Refusal(500, 'unexpected', 'Something failed.'));
  await screen.findByText('The list of runs did not come.');
});
