import { screen, waitFor } from '@testing-library/react';
import { Route, Routes } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import type { WaitingAnswer, WaitingItem } from '../../../../shared/schemas/waiting.ts';
import { SchemesPage } from '../../../../src/app/routes/schemes.tsx';
import { WaitingForYou } from '../../../../src/features/waiting/components/waiting-for-you.tsx';
import { PersonContext } from '../../../../src/features/session/person-context.ts';
import { waitingSentence, waitingThing } from '../../../../src/features/waiting/waiting-words.ts';
import { anId, aPersonAnswer, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const NOW = new Date(2026, 4, 21, 9, 30);

function anItem(overrides: Partial<WaitingItem> = {}): WaitingItem {
  return {
    kind: 'invitations-not-accepted',
    count: 2,
    text: 'Invitations not accepted yet.',
    since: new Date(2026, 4, 20, 12).toISOString(),
    link: '/people',
    ...overrides,
  };
}

function waitingIn(...waiting: WaitingItem[]): WaitingAnswer {
  const scheme = { id: anId(10), name: 'Port Dogger crossing', archivedAt: null };
  return { general: [], schemes: [{ scheme, roles: ['assessor'], waiting }] };
}

describe('waitingSentence', () => {
  it('names the day and what has waited longest', () => {
    const older = anItem({ since: new Date(2026, 4, 15, 12).toISOString() });
    expect(waitingSentence(waitingIn(), NOW)).toBe('Thursday 21 May. Nothing waits for you.');
    expect(waitingSentence(waitingIn(anItem()), NOW)).toBe(
      'Thursday 21 May. One thing waits, since yesterday.',
    );
    expect(waitingSentence({ ...waitingIn(anItem()), general: [older] }, NOW)).toBe(
      'Thursday 21 May. Two things wait, the oldest since Friday.',
    );
  });
});

describe('waitingThing', () => {
  it('speaks of one or of several', () => {
    expect(waitingThing(anItem({ count: 1 }))).toBe('invitation still out');
    expect(waitingThing(anItem())).toBe('invitations still out');
  });
});

describe('WaitingForYou', () => {
  it('shows each scheme with what waits and one button', async () => {
    renderPage(<WaitingForYou waiting={waitingIn(anItem())} />);
    expect(screen.getByRole('heading', { name: 'Port Dogger crossing' })).toBeTruthy();
    expect(screen.getByText('you are an assessor')).toBeTruthy();
    expect(screen.getByRole('link', { name: 'See them' }).getAttribute('href')).toBe('/people');
    expect(await axeFaults()).toEqual([]);
  });

  it('says that nothing waits, and leaves archived schemes out', () => {
    const waiting = waitingIn();
    const [open] = waiting.schemes;
    if (open === undefined) throw new Error('There is no scheme.');
    const scheme = {
      ...open.scheme,
      id: anId(11),
      name: 'Siding',
      archivedAt: '2026-05-01T09:00:00Z',
    };
    renderPage(<WaitingForYou waiting={{ ...waiting, schemes: [open, { ...open, scheme }] }} />);
    expect(screen.getByText('Nothing waits here.')).toBeTruthy();
    expect(screen.queryByText('Siding')).toBeNull();
  });
});

describe('the first page', () => {
  function open(roles: WaitingAnswer['schemes'][number]['roles'], isAdministrator = false) {
    const [scheme] = waitingIn().schemes;
    fakeApi({
      'GET /api/waiting': {
        general: [],
        schemes: scheme === undefined ? [] : [{ ...scheme, roles }],
      },
      'GET /api/schemes': [aSchemeAnswer()],
    });
    renderPage(
      <PersonContext value={{ ...aPersonAnswer({ isAdministrator }), demo: false }}>
        <Routes>
          <Route path="/" element={<SchemesPage />} />
          <Route path="/schemes/:schemeId/home" element={<p>My own page</p>} />
        </Routes>
      </PersonContext>,
    );
  }

  it('of an owner is the page of their building, where what is asked of them stands', async () => {
    open(['owner']);
    expect(await screen.findByText('My own page')).toBeTruthy();
  });

  it.each([
    [['assessor', 'owner'] as const, false],
    [['owner'] as const, true],
  ])('of who has another part too (%j) says what waits', async (roles, isAdministrator) => {
    open([...roles], isAdministrator);
    await waitFor(() => {
      expect(screen.getByText(/Nothing waits for you\.$/)).toBeTruthy();
    });
    expect(screen.queryByText('My own page')).toBeNull();
  });
});
