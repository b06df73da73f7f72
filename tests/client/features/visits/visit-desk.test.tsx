import { fireEvent, screen, waitFor } from '@testing-library/react';
import { expect, test } from 'vitest';
import { newVisitSchema } from '../../../../shared/schemas/visits.ts';
import { VisitDesk } from '../../../../src/features/visits/components/visit-desk.tsx';
import type { KeptVisit } from '../../../../src/features/visits/draft/kept-visit.ts';
import { VisitStoreContext } from '../../../../src/features/visits/draft/visit-store-context.ts';
import { PersonContext } from '../../../../src/features/session/person-context.ts';
import { aBuildingAnswer, anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { aKeptVisit, visitStoreInMemory } from '../../../support/kept-visits.ts';
import { renderPage } from '../../../support/render-page.tsx';

const PERSON = {
  id: anId(),
  name: 'A',
  email: 'a@example.org',
  isAdministrator: false,
  demo: true,
};
const SCHEME = `/api/schemes/${anId(10)}`;
const POST = `POST ${SCHEME}/buildings/1/visits`;

/** A visit as the server answers that it recorded it. */
function recorded(body: unknown) {
  const { id } = newVisitSchema.parse(body);
  const at = '2026-12-02T08:00:00.000Z';
  return {
    ...{ id, buildingId: 1, visitedAt: at, recordedAt: at, by: 'A', part: 'outside' },
    ...{ condition: null, construction: null, notes: '', defects: [], photographs: [] },
  };
}

/** The form of a building's visit, or what is kept of one, over a store in memory. */
function show(opened: KeptVisit, building = aBuildingAnswer(), ...kept: KeptVisit[]) {
  const phone = visitStoreInMemory(...kept);
  renderPage(
    <PersonContext value={PERSON}>
      <VisitStoreContext value={phone.store}>
        <VisitDesk opened={opened} building={building} />
      </VisitStoreContext>
    </PersonContext>,
  );
  return phone;
}

function aDraft(): KeptVisit {
  const { findings, ...visit } = aKeptVisit({ state: 'draft', visitedAt: null });
  return { ...visit, findings: { ...findings, part: null } };
}

test('every letter is kept at once, and a visit is recorded once it says from where it was seen', async () => {
  fakeApi({ [POST]: new Refusal(500, 'internal', 'Something failed on our side.') });
  const phone = show(aDraft());
  fireEvent.change(screen.getByLabelText('Condition'), { target: { value: 'poor' } });
  expect([...phone.visits.values()][0]?.findings.texts).toEqual({ condition: 'poor' });
  screen.getByText('In the register: good');
  fireEvent.click(screen.getByRole('button', { name: 'Record visit' }));
  const alert = await screen.findByRole('alert');
  expect(alert.textContent).toContain('Say whether you were inside or outside.');
  expect(document.activeElement).toBe(alert);
  fireEvent.click(screen.getByRole('button', { name: 'Add a defect' }));
  fireEvent.change(screen.getByLabelText('Where'), { target: { value: 'Gable' } });
  fireEvent.click(screen.getByRole('button', { name: 'Both' }));
  expect(await axeFaults(document.body)).toEqual([]);
  fireEvent.click(screen.getByRole('button', { name: 'Record visit' }));
  await screen.findByText(/^1 kept on this phone, not sent yet\./);
  await screen.findByText('Not sent: Something failed on our side.');
  const [kept] = phone.visits.values();
  expect(kept).toMatchObject({ state: 'kept', seen: { version: 1 } });
});

test('what the register says otherwise meanwhile is chosen, and goes on top of it', async () => {
  const seen = { version: 1, values: { condition: 'good' } };
  const { findings, ...visit } = aKeptVisit({ state: 'clash', seen, fault: 'Changed.' });
  const clash = { ...visit, findings: { ...findings, texts: { condition: 'poor' } } };
  const fresh = aBuildingAnswer({ condition: 'fair', version: 3 });
  const { calls } = fakeApi({
    [`GET ${SCHEME}/buildings/1`]: fresh,
    [`GET ${SCHEME}`]: aSchemeAnswer(),
    [POST]: recorded,
  });
  const phone = show(aDraft(), fresh, clash);
  const choice = await screen.findByRole('radiogroup', { name: 'Condition' });
  expect(choice.textContent).toContain('was good');
  expect(choice.textContent).toContain('Mine poor');
  expect(choice.textContent).toContain('Theirs fair');
  expect(await axeFaults(document.body)).toEqual([]);
  fireEvent.click(screen.getByRole('button', { name: 'Save what is chosen' }));
  await screen.findByText('1 visit sent.');
  await waitFor(() => {
    expect(phone.visits.size).toBe(0);
  });
  const sent = calls.filter(({ route }) => route === POST);
  expect(sent.map(({ body }) => body)).toMatchObject([
    { id: clash.id, changes: { version: 3, values: { condition: 'poor' } } },
  ]);
});
