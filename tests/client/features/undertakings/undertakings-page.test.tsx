import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { expect, test } from 'vitest';
import type { Undertaking } from '../../../../shared/schemas/undertakings.ts';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { UndertakingsPage } from '../../../../src/features/undertakings/undertakings-page.tsx';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const ALL = `/api/schemes/${anId(10)}/undertakings`;
const LATE = anUndertaking({
  ...{ number: 2, promise: 'Survey the school in the holidays', due: '2026-11-30' },
  isOverdue: true,
});

function anUndertaking(overrides: Partial<Undertaking> = {}): Undertaking {
  return {
    ...{ id: anId(90), number: 1, promise: 'No lorries at night', madeTo: 'The harbour board' },
    ...{ partyId: null, source: 'Hearing, day 3', building: null, stretch: { from: 100, to: 250 } },
    ...{ due: null, responsible: 'Site office', doneOn: null, evidence: '', isOverdue: false },
    ...{ version: 1, createdBy: 'Assessor', changedAt: '2026-12-01T09:00:00.000Z' },
    ...overrides,
  };
}

function show({ mayChange = true, mayRead = true } = {}) {
  const abilities = { readUndertakings: mayRead, updateUndertakings: mayChange };
  renderPage(
    <SchemeContext value={aSchemeAnswer({ abilities })}>
      <UndertakingsPage />
    </SchemeContext>,
  );
}

function fill(label: string, value: string): void {
  fireEvent.change(screen.getByLabelText(new RegExp(`^${label}`)), { target: { value } });
}

test('lists what was promised, says what is overdue, and opens on all that is known', async () => {
  const erased = anUndertaking({ ...{ id: anId(91), number: 3, madeTo: '' }, promise: 'Repaint' });
  fakeApi({ [`GET ${ALL}`]: [LATE, anUndertaking({ id: anId(92) }), erased] });
  show({ mayChange: false });
  const rows = await screen.findAllByRole('row');
  expect(rows).toHaveLength(4);
  const [, late, open] = rows;
  expect(within(late as HTMLElement).getByText('30 Nov 2026, late')).toBeTruthy();
  expect(within(late as HTMLElement).getByText('Overdue')).toBeTruthy();
  expect(within(open as HTMLElement).getByText('Open')).toBeTruthy();
  expect(await axeFaults()).toEqual([]);
  fireEvent.click(screen.getByText('Repaint'));
  expect(screen.getAllByText('Erased')).toHaveLength(2);
  expect(screen.getByText('Hearing, day 3')).toBeTruthy();
  expect(screen.queryByRole('button', { name: /Change/ })).toBeNull();
  expect(screen.queryByRole('button', { name: 'Add one…' })).toBeNull();
});

test('says what stands here while nothing does', async () => {
  fakeApi({ [`GET ${ALL}`]: [] });
  show();
  expect(await screen.findByText(/No undertakings yet/)).toBeTruthy();
});

test('asks for nothing where somebody may not read', () => {
  const { calls } = fakeApi({});
  show({ mayChange: false, mayRead: false });
  expect(screen.getByText('Undertakings are for those who work on the scheme.')).toBeTruthy();
  expect(calls).toEqual([]);
});

test('adds one for a stretch of the line once everything is said', async () => {
  const { calls } = fakeApi({ [`GET ${ALL}`]: [], [`POST ${ALL}`]: anUndertaking() });
  show();
  fireEvent.click(screen.getByRole('button', { name: 'Add one…' }));
  fill('What was promised', 'No lorries at night');
  fireEvent.click(screen.getByRole('button', { name: 'Add it' }));
  for (const fault of [
    'Say to whom.',
    'Say where it is written.',
    'Say who sees to it.',
    'Name the building or the stretch of the line.',
  ]) {
    expect(screen.getByText(fault)).toBeTruthy();
  }
  expect(calls.some(({ route }) => route.startsWith('POST'))).toBe(false);
  fill('Made to', 'The harbour board');
  fill('Source', 'Hearing, day 3');
  fill('Who sees to it', 'Site office');
  fill('Or from chainage', '100');
  fill('To chainage', '250');
  fireEvent.click(screen.getByRole('button', { name: 'Add it' }));
  await waitFor(() => {
    expect(screen.queryByRole('dialog')).toBeNull();
  });
  expect(calls.find(({ route }) => route === `POST ${ALL}`)?.body).toEqual({
    ...{ promise: 'No lorries at night', madeTo: 'The harbour board', partyId: null },
    ...{ source: 'Hearing, day 3', buildingId: null, stretch: { from: 100, to: 250 } },
    ...{ due: null, responsible: 'Site office', doneOn: null, evidence: '' },
  });
});

async function openLate(): Promise<void> {
  fireEvent.click(await screen.findByText(LATE.promise));
  fireEvent.click(screen.getByRole('button', { name: 'Change or say it is done…' }));
  await screen.findByRole('dialog', { name: 'Undertaking 2' });
}

test('is done only with what shows it, on top of the version that was seen', async () => {
  const one = `PUT ${ALL}/${LATE.id}`;
  const done = { ...LATE, doneOn: '2026-12-02', evidence: 'Survey 14', isOverdue: false };
  const { calls } = fakeApi({ [`GET ${ALL}`]: [LATE], [one]: done });
  show();
  await openLate();
  fill('Done on', '2026-12-02');
  fireEvent.click(screen.getByRole('button', { name: 'Keep it' }));
  expect(screen.getByText('Say what shows that it is done.')).toBeTruthy();
  fill('Evidence', 'Survey 14');
  fireEvent.click(screen.getByRole('button', { name: 'Keep it' }));
  await waitFor(() => {
    expect(screen.queryByRole('dialog')).toBeNull();
  });
  expect(calls.find(({ route }) => route === one)?.body).toMatchObject({
    version: 1,
    values: { doneOn: '2026-12-02', evidence: 'Survey 14' },
  });
});

test('keeps what was written where somebody else was first, and goes on from what stands now', async () => {
  const clash = new Refusal(409, 'conflict', 'Somebody has changed this meanwhile.');
  const theirs = { ...LATE, version: 2, responsible: 'Night office', due: '2026-12-24' };
  const sent: unknown[] = [];
  fakeApi({
    [`GET ${ALL}`]: () => (sent.length === 0 ? [LATE] : [theirs]),
    [`PUT ${ALL}/${LATE.id}`]: (body: unknown) => {
      sent.push(body);
      return sent.length === 1 ? clash : theirs;
    },
  });
  show();
  await openLate();
  fill('Done on', '2026-12-02');
  fill('Evidence', 'Survey 14, page 3');
  fireEvent.click(screen.getByRole('button', { name: 'Keep it' }));
  expect((await screen.findByRole('alert')).textContent).toContain('Nothing was kept.');
  expect(screen.getByDisplayValue('Survey 14, page 3')).toBeTruthy();
  fireEvent.click(await screen.findByRole('button', { name: 'See their change' }));
  const table = screen.getByRole('table', { name: 'Their change' });
  expect(within(table).getByRole('row', { name: 'Who sees to it Site office Night office' })).toBeTruthy(); // prettier-ignore
  expect(within(table).getAllByRole('row')).toHaveLength(3);
  expect(await axeFaults()).toEqual([]);
  fireEvent.click(screen.getByRole('button', { name: 'Keep mine on top of it' }));
  expect(screen.queryByRole('alert')).toBeNull();
  expect(screen.getByDisplayValue('Survey 14, page 3')).toBeTruthy();
  fireEvent.click(screen.getByRole('button', { name: 'Keep it' }));
  await waitFor(() => {
    expect(screen.queryByRole('dialog')).toBeNull();
  });
  expect(sent).toMatchObject([
    { version: 1 },
    {
      version: 2,
      values: {
        ...{ responsible: 'Night office', due: '2026-12-24' },
        ...{ doneOn: '2026-12-02', evidence: 'Survey 14, page 3' },
      },
    },
  ]);
});
