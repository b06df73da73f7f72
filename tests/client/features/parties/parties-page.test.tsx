import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { Party } from '../../../../shared/schemas/parties.ts';
import { PartiesPage } from '../../../../src/features/parties/parties-page.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const PATH = `/api/schemes/${anId(10)}/parties`;
const BUILDING = { id: 7, reference: 'B7', address: '12 Fishgate' };

function aParty(overrides: Partial<Party> = {}): Party {
  return {
    ...{ id: anId(60), kind: 'person', name: 'Leaseholder of 12 Fishgate', version: 3 },
    ...{ address: ['12 Fishgate', 'Port Dogger'], email: 'leaseholder@example.org' },
    ...{ channel: 'e-mail', representedBy: null, person: null, mergedInto: null, erasedAt: null },
    interests: [{ id: anId(61), building: BUILDING, kind: 'leaseholder', from: null, to: null }],
    ...overrides,
  };
}

function listed(...parties: readonly Party[]) {
  const rows = parties.map((party) => ({ ...party, interestCount: party.interests.length }));
  return { found: rows.length, parties: rows };
}

function detail(party: Party) {
  return { party, lettersKeptUntil: null, history: [] };
}

function openParties(abilities: Readonly<Record<string, boolean>> = {}, path = '/') {
  const scheme = aSchemeAnswer({
    abilities: { readParties: true, updateParties: true, readRegister: true, ...abilities },
  });
  renderPage(
    <SchemeContext value={scheme}>
      <PartiesPage />
    </SchemeContext>,
    path,
  );
}

describe('the list of parties', () => {
  it('says what to do first where nobody is known', async () => {
    fakeApi({ [`GET ${PATH}`]: listed() });
    openParties();
    const link = await screen.findByRole('link', { name: 'Bring in a table' });
    expect(link.getAttribute('href')).toBe(`/schemes/${anId(10)}/owners/parties/imports`);
  });

  it('names everybody, and leaves out what may not be done', async () => {
    fakeApi({ [`GET ${PATH}`]: listed(aParty({ interests: [] })) });
    openParties({ updateParties: false });
    expect(await screen.findByRole('button', { name: /^Leaseholder of/ })).toBeTruthy();
    expect(screen.getByText('none')).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'Add…' })).toBeNull();
    expect(await axeFaults()).toEqual([]);
  });

  it('asks for what is searched', async () => {
    const { calls } = fakeApi({ [`GET ${PATH}`]: listed(aParty()) });
    openParties();
    fireEvent.change(await screen.findByLabelText('Find parties'), { target: { value: 'quay' } });
    await waitFor(() => {
      expect(calls.some(({ route }) => route.includes('search=quay'))).toBe(true);
    });
  });
});

describe('a party', () => {
  it('is changed on top of the version that was seen', async () => {
    const party = aParty();
    const one = `${PATH}/${party.id}`;
    const { calls } = fakeApi({
      [`GET ${one}`]: detail(party),
      [`PUT ${one}`]: { ...party, version: 4 },
    });
    openParties({}, `/?party=${party.id}`);
    fireEvent.click(await screen.findByRole('button', { name: 'Change…' }));
    const dialog = within(screen.getByRole('dialog'));
    fireEvent.change(dialog.getByLabelText('Postal address'), {
      target: { value: 'Quay\n\n1 Row ' },
    });
    fireEvent.click(dialog.getByRole('button', { name: 'Keep it' }));
    await waitFor(() => {
      expect(calls.find(({ route }) => route.startsWith('PUT'))?.body).toMatchObject({
        version: 3,
        values: {
          address: ['Quay', '1 Row'],
          interests: [{ buildingId: 7, kind: 'leaseholder', from: null, to: null }],
        },
      });
    });
  });

  it('is not sent without an address for its letters, and says what the server refuses', async () => {
    const party = aParty();
    const one = `${PATH}/${party.id}`;
    const message = 'One of these buildings is not in the register.';
    const { calls } = fakeApi({
      [`GET ${one}`]: detail(party),
      [`PUT ${one}`]: new Refusal(422, 'invalid-input', '', [{ path: 'interests', message }]),
    });
    openParties({}, `/?party=${party.id}`);
    fireEvent.click(await screen.findByRole('button', { name: 'Change…' }));
    const dialog = within(screen.getByRole('dialog'));
    fireEvent.change(dialog.getByLabelText('E-mail'), { target: { value: '' } });
    fireEvent.click(dialog.getByRole('button', { name: 'Keep it' }));
    expect(await dialog.findByText('Letters by e-mail need an e-mail address.')).toBeTruthy();
    expect(calls.filter(({ route }) => route.startsWith('PUT'))).toEqual([]);
    fireEvent.change(dialog.getByLabelText('E-mail'), { target: { value: 'a@example.org' } });
    fireEvent.click(dialog.getByRole('button', { name: 'Keep it' }));
    expect(await dialog.findByText(message)).toBeTruthy();
  });

  it('is merged with the one that is likely the same; which stays is chosen', async () => {
    const [one, other] = [aParty(), aParty({ id: anId(62), name: 'Lessee', version: 5 })];
    const groups = [{ because: 'same e-mail', parties: [one, other].map(({ id, kind, name, address, email, version }) => ({ id, kind, name, address, email, version })) }]; // prettier-ignore
    const { calls } = fakeApi({
      [`GET ${PATH}/likely-same`]: groups,
      [`GET ${PATH}/${one.id}`]: detail(one),
      [`GET ${PATH}/${other.id}`]: detail(other),
      [`POST ${PATH}/${other.id}/merge`]: other,
    });
    openParties({}, '/?view=likely-same');
    fireEvent.click(await screen.findByRole('button', { name: 'Merge…' }));
    fireEvent.click(await screen.findByLabelText(/Keep this one/));
    fireEvent.click(screen.getByRole('button', { name: 'Merge them' }));
    await waitFor(() => {
      expect(calls.find(({ route }) => route.startsWith('POST'))?.body).toEqual({
        version: 5,
        other: { id: one.id, version: 3 },
      });
    });
  });

  it('is erased by the administrator once ground and day are given', async () => {
    const party = aParty();
    const erase = `${PATH}/${party.id}/erase`;
    const { calls } = fakeApi({ [`GET ${PATH}/${party.id}`]: detail(party), [`POST ${erase}`]: party });
    openParties({ updateParties: false, erasePersonalData: true }, `/?party=${party.id}`);
    fireEvent.click(await screen.findByRole('button', { name: 'Erase…' }));
    expect(screen.queryByRole('button', { name: 'Change…' })).toBeNull();
    fireEvent.click(screen.getByRole('button', { name: 'Erase for good' }));
    expect(await screen.findByText('Say on which ground.')).toBeTruthy();
    fireEvent.change(screen.getByLabelText('On which ground'), { target: { value: 'Asked' } });
    fireEvent.change(screen.getByLabelText('Asked for on'), { target: { value: '2026-11-20' } });
    fireEvent.click(screen.getByRole('button', { name: 'Erase for good' }));
    await waitFor(() => {
      const sent = calls.filter(({ route }) => route === `POST ${erase}`);
      expect(sent.map(({ body }) => body)).toEqual([{ version: 3, ground: 'Asked', askedOn: '2026-11-20' }]); // prettier-ignore
    });
  }); // prettier-ignore

  it('that was merged leads on to the one that stayed', async () => {
    const party = aParty({ mergedInto: anId(63) });
    fakeApi({
      [`GET ${PATH}/${party.id}`]: detail(party),
      [`GET ${PATH}/${anId(63)}`]: detail(aParty({ id: anId(63), name: 'The one that stayed' })),
    });
    openParties({}, `/?party=${party.id}`);
    fireEvent.click(await screen.findByRole('button', { name: 'Open that one' }));
    expect(await screen.findByRole('heading', { name: 'The one that stayed' })).toBeTruthy();
  });
});
