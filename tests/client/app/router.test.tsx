import { QueryClientProvider } from '@tanstack/react-query';
import { fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { describe, expect, it, vi } from 'vitest';
import { ROUTES } from '../../../src/app/router.tsx';
import { queryClient } from '../../../src/lib/query-client.ts';
import { aCrsAnswer, anId, aSchemeAnswer, aSession } from '../../support/answers.ts';
import { axeFaults } from '../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../support/fake-api.ts';

const SCHEME = `/schemes/${anId(10)}`;
const OWNER = { readScheme: true };

function open(path: string) {
  const router = createMemoryRouter([...ROUTES], { initialEntries: [path] });
  render(
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  return router;
}

function answers(more: Record<string, unknown> = {}) {
  return fakeApi({
    'GET /api/session': aSession(),
    'GET /api/schemes': [aSchemeAnswer()],
    [`GET /api${SCHEME}`]: aSchemeAnswer({ abilities: OWNER, roles: ['owner'] }),
    'GET /api/crs/32631': aCrsAnswer(),
    [`GET /api${SCHEME}/extent`]: {
      bounds: [0, 0, 6, 84],
      home: [0, 0, 6, 84],
      crs: 32631,
      from: 'crs',
    },
    'GET /api/waiting': { general: [], schemes: [] },
    ...more,
  });
}

describe('who is not signed in', () => {
  it('is asked to, and comes back to the page that was wanted', async () => {
    const sessions = [aSession(null)];
    answers({
      'GET /api/session': () => sessions[0],
      'POST /api/session': aSession(),
    });
    const router = open('/account');
    expect(await screen.findByRole('heading', { name: 'Sign in' })).toBeTruthy();
    fireEvent.change(screen.getByLabelText('E-mail'), { target: { value: 'a@example.org' } });
    fireEvent.change(screen.getByLabelText('Password'), { target: { value: 'x' } });
    fireEvent.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByRole('heading', { name: 'Account' })).toBeTruthy();
    expect(router.state.location.pathname).toBe('/account');
  });

  it('reads calmly that a link is spent', async () => {
    answers({
      'GET /api/session': aSession(null),
      'GET /api/links/old': new Refusal(410, 'link-spent', 'This link has been used.'),
    });
    open('/links/old');
    expect(await screen.findByRole('heading', { name: 'This link is spent' })).toBeTruthy();
    expect(screen.getByText(/Nothing is lost/)).toBeTruthy();
  });
});

describe('who is signed in', () => {
  it('begins with what waits', async () => {
    answers();
    open('/');
    expect(await screen.findByText(/Nothing waits for you\.$/)).toBeTruthy();
    expect(await screen.findByRole('link', { name: 'Port Dogger crossing' })).toBeTruthy();
    expect(screen.queryByRole('link', { name: 'New scheme' })).toBeNull();
    expect(await axeFaults()).toEqual([]);
  });

  it.each(['/people', '/audit', '/mailbox', '/schemes/new', '/nonsense'])(
    'finds nothing at %s without being an administrator',
    async (path) => {
      answers();
      open(path);
      expect(await screen.findByRole('heading', { name: 'Nothing here' })).toBeTruthy();
      const tabs = within(screen.getByRole('navigation', { name: 'Screens' })).getAllByRole('link');
      expect(tabs.map(({ textContent }) => textContent)).toEqual(['Schemes', 'Method']);
    },
  );

  it('opens a scheme at the first screen that they may see', async () => {
    answers();
    const router = open(SCHEME);
    expect(await screen.findByRole('heading', { name: 'Port Dogger crossing' })).toBeTruthy();
    expect(router.state.location.pathname).toBe(`${SCHEME}/settings`);
    const tabs = within(screen.getByRole('navigation', { name: 'Screens' })).getAllByRole('link');
    expect(tabs.map(({ textContent }) => textContent)).toEqual(['Description', 'Method']);
    expect(screen.queryByRole('navigation', { name: 'Settings' })).toBeNull();
  });

  it('finds nothing at a scheme that is not theirs', async () => {
    answers({ [`GET /api${SCHEME}`]: new Refusal(404, 'not-found', 'Nothing.') });
    open(SCHEME);
    expect(await screen.findByRole('heading', { name: 'Nothing here' })).toBeTruthy();
  });

  it('goes anywhere by name', async () => {
    answers();
    const router = open('/');
    await screen.findByRole('link', { name: 'Port Dogger crossing' });
    fireEvent.keyDown(document.body, { key: '/' });
    const search = screen.getByRole('combobox');
    fireEvent.change(search, { target: { value: 'account' } });
    fireEvent.keyDown(search, { key: 'Enter' });
    await waitFor(() => {
      expect(router.state.location.pathname).toBe('/account');
      expect(document.activeElement?.id).toBe('content');
    });
  });

  it('finds buildings of the scheme at hand by name', async () => {
    const mayRead = { ...OWNER, readRegister: true, readRules: true };
    const row = {
      id: 7,
      reference: 'B0197',
      name: 'Customs House',
      address: null,
      centre: [3, 54],
    };
    answers({
      [`GET /api${SCHEME}`]: aSchemeAnswer({ abilities: mayRead }),
      [`GET /api${SCHEME}/buildings?search=customs`]: [row],
    });
    open(`${SCHEME}/settings`);
    await screen.findByRole('navigation', { name: 'Settings' });
    fireEvent.keyDown(document.body, { key: '/' });
    fireEvent.change(screen.getByRole('combobox'), { target: { value: 'customs' } });
    expect((await screen.findByRole('option')).textContent).toBe('B0197Customs House');
  });

  it('signs out to the door', async () => {
    answers({ 'DELETE /api/session': aSession(null) });
    open('/');
    fireEvent.click(await screen.findByRole('button', { name: /^Assessor/ }));
    fireEvent.click(screen.getByRole('button', { name: 'Sign out' }));
    expect(await screen.findByRole('heading', { name: 'Sign in' })).toBeTruthy();
  });

  it('is told when the server cannot be reached', async () => {
    fakeApi({});
    open('/');
    const alert = await screen.findByRole('alert', {}, { timeout: 4000 });
    expect(alert.textContent).toContain('The server cannot be reached.');
  });
});

describe('the administrator', () => {
  it('has the screens outside of schemes, the mailbox in the demo only', async () => {
    answers({ 'GET /api/session': { ...aSession({ isAdministrator: true }), demo: false } });
    open('/');
    const nav = await screen.findByRole('navigation', { name: 'Screens' });
    const names = within(nav)
      .getAllByRole('link')
      .map(({ textContent }) => textContent);
    expect(names).toEqual(['Schemes', 'People', 'Audit', 'Method']);
    expect(await screen.findByRole('link', { name: 'New scheme' })).toBeTruthy();
  });
});

describe('the bar of a scheme', () => {
  it('keeps a menu open that was opened before the scheme arrived', async () => {
    let arrive: (scheme: unknown) => void = () => undefined;
    const scheme = new Promise((resolve) => {
      arrive = resolve;
    });
    answers();
    const fetchNow = globalThis.fetch;
    vi.stubGlobal('fetch', async (path: string, init?: RequestInit) => {
      if (path === `/api${SCHEME}`) await scheme;
      return fetchNow(path, init);
    });
    open(`${SCHEME}/settings`);
    fireEvent.click(await screen.findByRole('button', { name: /^Assessor/ }));
    arrive(undefined);
    expect(await screen.findByRole('heading', { name: 'Port Dogger crossing' })).toBeTruthy();
    expect(screen.getByRole('link', { name: 'Account' })).toBeTruthy();
  });

  it('tells an owner what is driven, and nothing of grids', async () => {
    answers();
    open(`${SCHEME}/settings`);
    expect(await screen.findByText('Nothing is written about it yet.')).toBeTruthy();
    expect(screen.queryByText(/EPSG/)).toBeNull();
  });

  it('lists the keys that work on its screen', async () => {
    answers();
    open(`${SCHEME}/settings`);
    await screen.findByRole('heading', { name: 'Port Dogger crossing' });
    fireEvent.keyDown(document.body, { key: '?' });
    expect(screen.getAllByRole('term').map(({ textContent }) => textContent)).toEqual([
      '/',
      '?',
      'Esc',
    ]);
  });
});
