import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { PeoplePage } from '../../../../src/app/routes/people.tsx';
import {
  partsInWords,
  partsOf,
  signInState,
} from '../../../../src/features/people/person-words.ts';
import { PersonContext } from '../../../../src/features/session/person-context.ts';
import { anId, aPersonAnswer, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const SCHEME = { schemeId: anId(10), schemeName: 'Port Dogger crossing' };
const INVITED = aPersonAnswer({
  id: anId(21),
  name: 'Clerk of works',
  email: 'clerk@example.org',
  hasPassword: false,
  invitedUntil: '2999-05-08T09:00:00.000Z',
  memberships: [{ ...SCHEME, role: 'assessor' }],
  abilities: { invite: true, withdraw: true, changeEmail: true, shutOut: true, readmit: false },
});

const LISTS = {
  'GET /api/people': [aPersonAnswer(), INVITED],
  'GET /api/schemes': [
    aSchemeAnswer(),
    aSchemeAnswer({ id: anId(11), archivedAt: '2026-05-01T09:00:00Z' }),
  ],
};

const REFUSED = { state: 'failed', serverWords: '550 No such mailbox' } as const;

function type(label: string, value: string): void {
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
}

describe('signInState', () => {
  const now = new Date('2026-05-21T09:00:00Z');

  it.each([
    [{ hasPassword: true, invitedUntil: null }, 'Can sign in'],
    [{ hasPassword: false, invitedUntil: '2026-05-28T09:00:00.000Z' }, 'Invited until 28 May 2026'],
    [{ hasPassword: false, invitedUntil: '2026-05-20T09:00:00.000Z' }, 'Invitation too old'],
    [{ hasPassword: false, invitedUntil: null }, 'Not invited'],
    [
      { hasPassword: false, invitedUntil: '2026-05-28T09:00:00.000Z', letter: REFUSED },
      'Letter not sent',
    ],
    [{ hasPassword: true, invitedUntil: null, shutOutAt: '2026-05-20T09:00:00.000Z' }, 'Shut out'],
  ])('of %j is "%s"', (person, words) => {
    expect(signInState({ shutOutAt: null, letter: null, ...person }, now).words).toBe(words);
  });
});

describe('partsOf', () => {
  it('gathers roles by scheme', () => {
    const memberships = [
      { ...SCHEME, role: 'assessor' },
      { schemeId: anId(12), schemeName: 'Sewer', role: 'witness' },
      { ...SCHEME, role: 'designer' },
    ] as const;
    expect(partsOf({ memberships: [...memberships] })).toHaveLength(2);
    expect(partsInWords({ memberships: [...memberships] })).toBe(
      'Port Dogger crossing: assessor, designer; Sewer: witness',
    );
  });
});

describe('the page of people', () => {
  it('lists everybody, and says who cannot sign in yet', async () => {
    fakeApi(LISTS);
    renderPage(<PeoplePage />);
    expect(await screen.findByText('2 with an account; 1 of them cannot sign in.')).toBeTruthy();
    expect(screen.getAllByRole('row')).toHaveLength(3);
    expect(await axeFaults()).toEqual([]);
  });

  it('invites with a scheme and a role, and leaves out a line with no scheme', async () => {
    const { calls } = fakeApi({
      ...LISTS,
      'POST /api/people': INVITED,
    });
    renderPage(<PeoplePage />);
    await screen.findByRole('option', { name: 'Port Dogger crossing' });
    expect(screen.getAllByRole('option', { name: 'Port Dogger crossing' })).toHaveLength(1);
    type('Name', 'Clerk of works');
    type('E-mail', 'Clerk@example.org');
    fireEvent.change(screen.getByLabelText('Scheme'), { target: { value: anId(10) } });
    fireEvent.change(screen.getByLabelText('Role'), { target: { value: 'witness' } });
    fireEvent.click(screen.getByRole('button', { name: 'Another scheme or role' }));
    fireEvent.click(screen.getByRole('button', { name: 'Send the invitation' }));
    expect(await screen.findByText(/is on its way/)).toBeTruthy();
    expect(calls.find(({ route }) => route === 'POST /api/people')?.body).toEqual({
      name: 'Clerk of works',
      email: 'clerk@example.org',
      isAdministrator: false,
      memberships: [{ schemeId: anId(10), role: 'witness' }],
    });
    expect(screen.getByLabelText<HTMLInputElement>('Name').value).toBe('');
  });

  it.each([
    [REFUSED, 'was not sent. The account is made. The mail server said: “550 No such mailbox”'],
    [{ ...REFUSED, state: 'waiting' }, 'has not gone out yet. It is tried again.'],
  ])('says in their row why a letter did not go out', async (letter, words) => {
    fakeApi({ ...LISTS, 'GET /api/people': [{ ...INVITED, letter }] });
    renderPage(<PeoplePage />);
    fireEvent.click(await screen.findByText('Clerk of works'));
    expect((await screen.findByRole('alert')).textContent).toContain(words);
    expect(screen.getByRole('button', { name: 'Send the invitation again' })).toBeTruthy();
  });

  it('keeps what was typed when somebody has the address already', async () => {
    const fields = [{ path: 'email', message: 'Somebody has this address already.' }];
    const refusal = new Refusal(
      409,
      'already-exists',
      'Somebody has this address already.',
      fields,
    );
    fakeApi({ ...LISTS, 'POST /api/people': refusal });
    renderPage(<PeoplePage />);
    type('Name', 'Clerk again');
    type('E-mail', 'clerk@example.org');
    fireEvent.click(screen.getByLabelText('Administrator'));
    fireEvent.click(screen.getByRole('button', { name: 'Send the invitation' }));
    expect(await screen.findByText('Somebody has this address already.')).toBeTruthy();
    expect(screen.getByLabelText<HTMLInputElement>('Name').value).toBe('Clerk again');
    expect(document.activeElement).toBe(screen.getByLabelText('E-mail'));
  });

  it('asks before somebody is invited who will see nothing', async () => {
    const { calls } = fakeApi({
      ...LISTS,
      'POST /api/people': INVITED,
    });
    renderPage(<PeoplePage />);
    type('Name', 'Clerk of works');
    type('E-mail', 'clerk@example.org');
    fireEvent.click(screen.getByRole('button', { name: 'Send the invitation' }));
    const question = await screen.findByRole('dialog', { name: 'Invite without a scheme?' });
    expect(calls.map(({ route }) => route)).not.toContain('POST /api/people');
    fireEvent.click(within(question).getByRole('button', { name: 'Send the invitation' }));
    expect(await screen.findByText(/is on its way/)).toBeTruthy();
  });

  it('withdraws an invitation', async () => {
    const address = `DELETE /api/people/${INVITED.id}/invitations`;
    const { calls } = fakeApi({ ...LISTS, [address]: { ...INVITED, invitedUntil: null } });
    renderPage(<PeoplePage />);
    fireEvent.click(await screen.findByText('Clerk of works'));
    fireEvent.click(screen.getByRole('button', { name: 'Withdraw the invitation' }));
    await waitFor(() => {
      expect(calls.map(({ route }) => route)).toContain(address);
    });
  });

  it('shuts a person out once it has asked', async () => {
    const address = `PUT /api/people/${anId(20)}/shut-out`;
    const { calls } = fakeApi({ ...LISTS, [address]: aPersonAnswer() });
    renderPage(<PeoplePage />);
    fireEvent.click(await screen.findByText('Designer', { selector: 'b' }));
    fireEvent.click(screen.getByRole('button', { name: 'Shut out' }));
    const question = screen.getByRole('dialog', { name: 'Shut out Designer?' });
    fireEvent.click(within(question).getByRole('button', { name: 'Shut out' }));
    await waitFor(() => {
      expect(calls.find(({ route }) => route === address)?.body).toEqual({ shutOut: true });
    });
  });

  it('asks before an administrator gives up their own right', async () => {
    const me = aPersonAnswer({ isAdministrator: true });
    const { calls } = fakeApi({ ...LISTS, 'GET /api/people': [me] });
    renderPage(
      <PersonContext value={{ ...me, demo: false }}>
        <PeoplePage />
      </PersonContext>,
    );
    fireEvent.click(await screen.findByText('Designer', { selector: 'b' }));
    fireEvent.click(screen.getAllByLabelText('Administrator')[0] ?? document.body);
    fireEvent.click(screen.getByRole('button', { name: 'Save' }));
    const question = await screen.findByRole('dialog', { name: 'Give up being administrator?' });
    fireEvent.click(within(question).getByRole('button', { name: 'Leave it as it is' }));
    expect(calls.some(({ route }) => route.startsWith('PATCH'))).toBe(false);
  });

  it('opens a row on what can be changed, and sends an invitation again', async () => {
    const again = `POST /api/people/${INVITED.id}/invitations`;
    const { calls } = fakeApi({ ...LISTS, [again]: INVITED });
    renderPage(<PeoplePage />);
    fireEvent.click(await screen.findByText('Clerk of works'));
    fireEvent.click(screen.getByRole('button', { name: 'Send the invitation again' }));
    await waitFor(() => {
      expect(calls.map(({ route }) => route)).toContain(again);
    });
    expect(await screen.findByText(/is on its way/)).toBeTruthy();
    fireEvent.click(screen.getAllByText('Clerk of works')[0] ?? document.body);
    expect(screen.queryByRole('button', { name: 'Send the invitation again' })).toBeNull();
  });

  it('offers no second invitation to who can sign in', async () => {
    fakeApi(LISTS);
    renderPage(<PeoplePage />);
    fireEvent.click(await screen.findByText('Designer', { selector: 'b' }));
    expect(screen.getByText('In no scheme yet.')).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'Send the invitation again' })).toBeNull();
  });
});
