import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { MembersPage } from '../../../../src/app/routes/settings-people.tsx';
import { yourRoles } from '../../../../src/features/members/roles-in-words.ts';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { aMemberAnswer, anId, aPersonAnswer, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const MEMBERS = `/api/schemes/${anId(10)}/members`;
const CHANGE = `PUT ${MEMBERS}/${anId(30)}`;

function openMembers(abilities: Record<string, boolean>) {
  const scheme = aSchemeAnswer({ abilities });
  renderPage(
    <SchemeContext value={scheme}>
      <MembersPage />
    </SchemeContext>,
  );
}

const MANAGES = { readMembers: true, manageMembers: true };

describe('yourRoles', () => {
  it('names every role, and the administrator who has none', () => {
    expect(yourRoles(['assessor', 'designer'])).toBe('you are an assessor and a designer');
    expect(yourRoles([])).toBe('you administer it');
  });
});

describe('the people of a scheme', () => {
  it('are given a further role by a tick', async () => {
    const { calls } = fakeApi({
      [`GET ${MEMBERS}`]: [aMemberAnswer()],
      'GET /api/people': [],
      [CHANGE]: aMemberAnswer(),
    });
    openMembers(MANAGES);
    fireEvent.click(await screen.findByLabelText('Assessor is designer'));
    await waitFor(() => {
      expect(calls.find(({ route }) => route === CHANGE)?.body).toEqual({
        roles: ['designer', 'assessor'],
      });
    });
    expect(await axeFaults()).toEqual([]);
  });

  it('leave only after a question', async () => {
    const { calls } = fakeApi({
      [`GET ${MEMBERS}`]: [aMemberAnswer({ accepted: false })],
      'GET /api/people': [],
      [CHANGE]: aMemberAnswer({ roles: [] }),
    });
    openMembers(MANAGES);
    fireEvent.click(await screen.findByLabelText('Assessor is assessor'));
    const question = screen.getByRole('dialog', { name: 'Take Assessor out of the scheme?' });
    expect(calls.map(({ route }) => route)).not.toContain(CHANGE);
    fireEvent.click(within(question).getByRole('button', { name: 'Take them out' }));
    await waitFor(() => {
      expect(calls.find(({ route }) => route === CHANGE)?.body).toEqual({ roles: [] });
    });
  });

  it('are joined by somebody who is not among them yet', async () => {
    const outside = aPersonAnswer();
    const inside = aPersonAnswer({ id: anId(30), name: 'Assessor' });
    const add = `PUT ${MEMBERS}/${outside.id}`;
    const { calls } = fakeApi({
      [`GET ${MEMBERS}`]: [aMemberAnswer()],
      'GET /api/people': [inside, outside],
      [add]: aMemberAnswer(),
    });
    openMembers(MANAGES);
    await screen.findByRole('option', { name: 'Designer, designer@example.org' });
    const person = screen.getByLabelText('Person');
    expect(within(person).getAllByRole('option')).toHaveLength(2);
    fireEvent.click(screen.getByRole('button', { name: 'Add to the scheme' }));
    expect(await screen.findByText('Choose a person.')).toBeTruthy();
    fireEvent.change(person, { target: { value: outside.id } });
    fireEvent.click(screen.getByRole('button', { name: 'Add to the scheme' }));
    await waitFor(() => {
      expect(calls.find(({ route }) => route === add)?.body).toEqual({ roles: ['assessor'] });
    });
  });

  it('are only read where they may not be changed', async () => {
    fakeApi({ [`GET ${MEMBERS}`]: [aMemberAnswer()] });
    openMembers({ readMembers: true });
    expect(await screen.findByText('Assessor', { selector: 'b' })).toBeTruthy();
    expect(screen.queryByRole('checkbox')).toBeNull();
    expect(screen.queryByRole('complementary')).toBeNull();
  });

  it('are not there for who may not read them', () => {
    openMembers({});
    expect(screen.getByRole('heading', { name: 'Nothing here' })).toBeTruthy();
  });
});
