import { fireEvent, screen, waitFor } from '@testing-library/react';
import type { ReactNode } from 'react';
import { Route, Routes } from 'react-router-dom';
import { expect, test } from 'vitest';
import type { Matter, MatterLine } from '../../../../shared/schemas/matter-answers.ts';
import { InboxPage } from '../../../../src/features/matters/inbox-page.tsx';
import { MatterPage } from '../../../../src/features/matters/matter-page.tsx';
import { WriteForm } from '../../../../src/features/matters/components/write-form.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const SCHEME = `/api/schemes/${anId(10)}`;
const AT = '2026-12-02T08:00:00.000Z';

function aLine(overrides: Partial<MatterLine> = {}): MatterLine {
  return {
    ...{ id: anId(20), number: 1, kind: 'concern', title: 'Crack', suggestion: null },
    building: { id: 1, reference: 'B0001', name: null, address: null },
    ...{ state: 'open', due: '2026-12-04', openedAt: AT, changedAt: AT },
    party: { id: anId(30), name: 'Owner' },
    ...{ assignedTo: null, isOverdue: false, isErased: false, version: 1, messages: 1 },
    ...overrides,
  };
}

function aThread(): Matter {
  const { building, ...line } = aLine();
  return {
    ...line,
    building: { ...building, version: 1, isInRegister: true },
    ...{ isMailed: true, assessors: [], messages: [] },
  };
}

function show(page: ReactNode, path = '/') {
  const abilities = { readMatters: true, answerMatters: true };
  renderPage(<SchemeContext value={aSchemeAnswer({ abilities })}>{page}</SchemeContext>, path);
}

test('shows what waits, and what the filter in its address means', async () => {
  const lines: MatterLine[] = [aLine({ isOverdue: true })];
  const { calls } = fakeApi({
    [`GET ${SCHEME}/matters`]: (words: unknown) => {
      const isOpen = words instanceof URLSearchParams && words.get('state') === 'open';
      return { total: isOpen ? 1 : 0, matters: isOpen ? lines : [], assessors: [] };
    },
  });
  show(<InboxPage />);
  expect(await screen.findByRole('link', { name: 'Crack' })).toBeTruthy();
  expect(screen.getByText('4 Dec 2026, late')).toBeTruthy();
  expect(await axeFaults()).toEqual([]);
  fireEvent.click(screen.getByRole('button', { name: 'Closed' }));
  expect(await screen.findByText('No matter is like this.')).toBeTruthy();
  expect(calls.at(-1)?.route).toContain('state=closed');
});

test('says what comes here while nothing does', async () => {
  fakeApi({ [`GET ${SCHEME}/matters`]: { total: 0, matters: [], assessors: [] } });
  show(<InboxPage />);
  expect(await screen.findByText(/Nothing waits for an answer/)).toBeTruthy();
});

test('an answer that clashes keeps what was written, under the same number', async () => {
  const { calls } = fakeApi({
    [`POST ${SCHEME}/matters/${anId(20)}/messages`]: new Refusal(409, 'conflict', 'Changed.'),
  });
  show(<WriteForm schemeId={anId(10)} matter={aThread()} onReload={() => undefined} />);
  const field = screen.getByLabelText('Answer to the owner');
  fireEvent.click(screen.getByRole('button', { name: 'Send the answer' }));
  expect(screen.getByText('Write something.')).toBeTruthy();
  fireEvent.change(field, { target: { value: 'We come.' } });
  fireEvent.click(screen.getByRole('button', { name: 'Send the answer' }));
  expect(await screen.findByRole('button', { name: 'See what is new' })).toBeTruthy();
  expect(screen.getByDisplayValue('We come.')).toBeTruthy();
  fireEvent.click(screen.getByRole('button', { name: 'Send the answer' }));
  const posts = () => calls.filter(({ route }) => route.startsWith('POST'));
  await waitFor(() => {
    expect(posts()).toHaveLength(2);
  });
  expect(posts()[0]?.body).toEqual(posts()[1]?.body);
  expect(posts()[0]?.body).toMatchObject({ version: 1, side: 'team', text: 'We come.' });
});

test('a matter of an erased party offers no answer, and says why', async () => {
  fakeApi({ [`GET ${SCHEME}/matters/${anId(20)}`]: { ...aThread(), isErased: true } });
  show(
    <Routes>
      <Route path="/inbox/:matterId" element={<MatterPage />} />
    </Routes>,
    `/inbox/${anId(20)}`,
  );
  expect(await screen.findByText(/Nothing more can be written: nobody would read it/)).toBeTruthy();
  expect(screen.queryByRole('button', { name: 'Send the answer' })).toBeNull();
  expect(screen.getByRole('combobox', { name: 'State' })).toBeTruthy();
});
