import { fireEvent, screen, waitFor } from '@testing-library/react';
import { beforeEach, expect, test, vi } from 'vitest';
import type { OwnAppointment } from '../../../../shared/schemas/appointments.ts';
import type { OwnMatter } from '../../../../shared/schemas/matter-answers.ts';
import { newMatterSchema, ownMessageSchema } from '../../../../shared/schemas/matters.ts';
import { answerDaysSchema } from '../../../../shared/schemas/owner-terms.ts';
import type { Own, OwnBuilding } from '../../../../shared/schemas/own.ts';
import { OwnPage } from '../../../../src/features/own/own-page.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { PersonContext } from '../../../../src/features/session/person-context.ts';
import { apiUpload } from '../../../../src/lib/api-upload.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { readingEase } from '../../../support/reading-ease.ts';
import { renderPage } from '../../../support/render-page.tsx';

vi.mock('../../../../src/lib/api-upload.ts', () => ({ apiUpload: vi.fn() }));
vi.mock('../../../../src/features/visits/photographs/shrunk-photograph.ts', () => ({
  shrunkPhotograph: (file: Blob) => Promise.resolve({ file, width: 3, height: 2 }),
}));

const OWN = `/api/schemes/${anId(10)}/own`;
const PERSON = {
  ...{ id: anId(), name: 'Owner', email: 'o@example.org', isAdministrator: false, demo: false },
};

beforeEach(() => {
  // the ground of the map is asked for as tiles, which are not there
  vi.stubGlobal('ResizeObserver', undefined);
  vi.stubGlobal('URL', Object.assign(URL, { createObjectURL: () => 'blob:seen', revokeObjectURL: () => undefined })); // prettier-ignore
});

function aBuilding(overrides: Partial<OwnBuilding> = {}): OwnBuilding {
  return {
    ...{ id: 7, name: null, address: '9 Fishgate', use: 'dwelling', decision: null, measures: [] },
    outline: [[[[1.64, 54.75], [1.6402, 54.75], [1.6402, 54.7501], [1.64, 54.75]]]],
    figures: {
      ...{ settlement: 0.044, most: 0.06, categoryLow: 0, category: 1, categoryHigh: 1 },
      ...{ tunnels: 2, depth: 20, distance: 0, diameter: 6.6 },
      lines: [[[1.63, 54.75], [1.65, 54.7502]]],
    },
    ...overrides,
  }; // prettier-ignore
}

function aLetter(acknowledgedAt: string | null = null): Own['letters'][number] {
  return {
    ...{ id: anId(30), subject: 'A new tunnel', sentAt: '2026-11-20T09:00:00.000Z' },
    ...{ answerBy: '2026-12-23', acknowledgedAt, buildings: [7] },
  };
}

function anAppointment(overrides: Partial<OwnAppointment> = {}): OwnAppointment {
  return {
    ...{ id: anId(40), purpose: 'condition survey', minutes: 60, place: 'At the door' },
    building: { id: 7, reference: 'B7', name: null, address: '9 Fishgate' },
    ...{ startsAt: '2090-06-09T10:00:00.000Z', state: 'offered', askedFor: null, version: 3 },
    ...{ changedAt: '2026-11-20T09:00:00.000Z' },
    ...overrides,
  };
}

function aMatter(overrides: Partial<OwnMatter> = {}): OwnMatter {
  return {
    ...{ id: anId(50), kind: 'question', title: 'The day', suggestion: null },
    building: { id: 7, reference: 'B7', name: null, address: '9 Fishgate' },
    ...{ state: 'open', due: '2026-12-11', openedAt: '2026-12-04T09:00:00.000Z' },
    ...{ changedAt: '2026-12-04T09:00:00.000Z', messages: [] },
    ...overrides,
  };
}

function anOwn(overrides: Partial<Own> = {}): Own {
  return {
    scheme: { id: anId(10), name: 'Port Dogger crossing' },
    contact: { name: 'The owners’ line', email: 'owners@example.org', phone: '', hours: '' },
    milestones: [{ when: 'Spring 2028', title: 'We visit again', words: 'New cracks are put right.' }], // prettier-ignore
    ...{ repairs: 'Whatever cracks we mend.', timeZone: 'Europe/London' },
    answerDays: answerDaysSchema.parse({ question: 3, concern: 1, claim: 10, correction: 10 }),
    letters: [aLetter()],
    buildings: [aBuilding()],
    ...overrides,
  };
}

type Told = {
  readonly own?: Own;
  readonly appointments?: readonly OwnAppointment[];
  readonly matters?: readonly OwnMatter[];
};

function show({ own = anOwn(), appointments = [], matters = [] }: Told = {}, more = {}) {
  const abilities = { readScheme: true, readOwnBuildings: true, answerAsOwner: true };
  const scheme = aSchemeAnswer({ abilities, roles: ['owner'] });
  const api = fakeApi({
    [`GET ${OWN}`]: own,
    [`GET ${OWN}/appointments`]: appointments,
    [`GET ${OWN}/matters`]: matters,
    ...more,
  });
  renderPage(
    <PersonContext value={PERSON}>
      <SchemeContext value={scheme}>
        <OwnPage />
      </SchemeContext>
    </PersonContext>,
  );
  return api;
}

test('one sentence, one paragraph, one picture, one thing to do, then dates', async () => {
  const { calls } = show(
    {},
    { [`POST ${OWN}/letters/${anId(30)}/acknowledge`]: aLetter('2026-12-02T09:00:00.000Z') },
  );
  await screen.findByRole('heading', {
    level: 1,
    name: 'Your home is expected to stay sound, with hairline cracks at most',
  });
  screen.getByText(/about 44 millimetres, slowly/);
  screen.getByText('About as thin as the edge of a fingernail');
  screen.getByRole('img', { name: 'Map: your home and the two tunnels. North is at the top.' });
  screen.getByText('We visit again');
  const promised = screen.getByText('Whatever cracks we mend.');
  expect(promised.closest('section')?.textContent).toContain('What we will do');
  expect(document.body.textContent).not.toMatch(/categor/i);
  expect(await axeFaults(document.body)).toEqual([]);
  fireEvent.click(screen.getByRole('button', { name: 'I have the letter' }));
  const thanks = await screen.findByText(/We know that our letter has reached you/);
  expect(thanks.parentElement).toBe(document.activeElement);
  expect(calls.map(({ route }) => route)).toContain(`POST ${OWN}/letters/${anId(30)}/acknowledge`);
});

test('before a letter with figures it says calmly that the work is under way', async () => {
  show({ own: anOwn({ letters: [], buildings: [aBuilding({ figures: null })] }) });
  await screen.findByRole('heading', { name: 'We are looking at what the tunnel means for you' });
  screen.getByRole('heading', { name: 'You need do nothing now' });
  expect(screen.queryByText(/millimetre/)).toBeNull();
  expect(screen.queryByRole('button', { name: 'How sure are you?' })).toBeNull();
});

test('of several buildings one is chosen', async () => {
  const shop = aBuilding({ id: 8, address: '2 Quay', use: 'shop', figures: null });
  show({ own: anOwn({ buildings: [aBuilding(), shop] }) });
  const choice = await screen.findByLabelText('Which of your buildings?');
  fireEvent.change(choice, { target: { value: '8' } });
  await screen.findByText(/near your building/);
  expect(screen.queryByText('A new tunnel')).toBeNull();
});

test('who has no building yet is told whom to ask', async () => {
  show({ own: anOwn({ letters: [], buildings: [] }) });
  await screen.findByRole('heading', { name: 'No building is linked to you yet' });
});

test('a survey that is offered is agreed to, or other days are asked for', async () => {
  const letters = [aLetter('2026-12-02T09:00:00.000Z')];
  const asked = anAppointment({
    state: 'another day asked for',
    askedFor: { days: [{ day: '2090-06-14', part: 'afternoon' }], note: '' },
  });
  const { calls } = show(
    { own: anOwn({ letters }), appointments: [anAppointment()] },
    { [`POST ${OWN}/appointments/${anId(40)}/answer`]: asked },
  );
  await screen.findByRole('heading', { name: 'Please choose a day for the survey' });
  screen.getByRole('button', { name: 'That suits me' });
  fireEvent.click(screen.getByRole('button', { name: 'Pick another day' }));
  fireEvent.click(screen.getByRole('button', { name: 'Send the days' }));
  await screen.findByText('Please choose at least one day.');
  fireEvent.change(screen.getByLabelText('First day'), { target: { value: '2090-06-14' } });
  const [part] = screen.getAllByLabelText('Time of day');
  if (part !== undefined) fireEvent.change(part, { target: { value: 'afternoon' } });
  expect(await axeFaults(document.body)).toEqual([]);
  fireEvent.click(screen.getByRole('button', { name: 'Send the days' }));
  await screen.findByText(/We look for a time that suits you, and write to you/);
  const sent = calls.find(({ route }) => route.startsWith('POST'));
  expect(sent?.body).toEqual({
    ...{ version: 3, answer: 'another day', note: '' },
    days: [{ day: '2090-06-14', part: 'afternoon' }],
  });
});

test('a question says what is missing, keeps what was typed when it fails, and thanks', async () => {
  let isDown = true;
  const { calls } = show(
    {},
    {
      [`POST ${OWN}/matters`]: () =>
        isDown ? new Refusal(500, 'internal', 'Something failed on our side.') : aMatter(),
    },
  );
  fireEvent.click(await screen.findByRole('button', { name: 'Ask a question' }));
  await waitFor(() => {
    expect(document.activeElement?.textContent).toBe('Ask a question');
  });
  fireEvent.change(screen.getByLabelText('What is it about?'), { target: { value: 'The day' } });
  fireEvent.click(screen.getByRole('button', { name: 'Send the question' }));
  await screen.findByText('Write something.');
  expect(document.activeElement).toBe(screen.getByLabelText('Your question'));
  fireEvent.change(screen.getByLabelText('Your question'), { target: { value: 'When?' } });
  fireEvent.click(screen.getByRole('button', { name: 'Send the question' }));
  await screen.findByText('It has not been sent.');
  expect(screen.getByLabelText<HTMLTextAreaElement>('Your question').value).toBe('When?');
  isDown = false;
  fireEvent.click(screen.getByRole('button', { name: 'Send the question' }));
  await screen.findByText('Thank you. Someone will answer by Friday 11 December.');
  const sent = calls.filter(({ route }) => route === `POST ${OWN}/matters`);
  const ids = sent.map(({ body }) => newMatterSchema.parse(body).id);
  expect(ids).toHaveLength(2);
  expect(new Set(ids).size).toBe(1);
});

test('times are told by the clocks of the scheme, and answers in the days it promises', async () => {
  const letters = [aLetter('2026-12-02T09:00:00.000Z')];
  const appointments = [anAppointment({ startsAt: '2090-06-09T10:00:00.000Z' })];
  const own = anOwn({ letters, timeZone: 'Pacific/Auckland' });
  show({ own, appointments });
  const box = await screen.findByRole('region', { name: 'Please choose a day for the survey' });
  expect(box.textContent).toContain('Friday 9 June 2090, 22:00');
  expect(screen.getAllByText('Friday 9 June 2090, 22:00')).toHaveLength(2);
  fireEvent.click(screen.getByRole('button', { name: 'Report a crack or a worry' }));
  await screen.findByText(/Someone looks at it within 1 working day and answers you/);
  fireEvent.click(screen.getByRole('button', { name: 'Ask a question' }));
  await screen.findByText(/Someone will answer within 3 working days/);
});

test('a fact is put right by its name in plain words', async () => {
  const { calls } = show({}, { [`POST ${OWN}/matters`]: aMatter({ kind: 'question' }) });
  fireEvent.click(
    await screen.findByRole('button', { name: 'Something about my building is wrong' }),
  );
  fireEvent.change(screen.getByLabelText('What should it say?'), { target: { value: '3' } });
  fireEvent.change(screen.getByLabelText(/How do you know/), { target: { value: 'I live here.' } });
  fireEvent.click(screen.getByRole('button', { name: 'Send the correction' }));
  await screen.findByText(/Someone will answer/);
  expect(calls.find(({ route }) => route.startsWith('POST'))?.body).toMatchObject({
    ...{ kind: 'correction', title: 'How many floors it has' },
    suggestion: { field: 'storeys', value: 3 },
  });
});

test('what was asked stands there with its answer, and can be written to again', async () => {
  const message = { photographs: [], writtenAt: '2026-12-04T09:00:00.000Z' };
  const answered = aMatter({
    state: 'answered',
    messages: [
      { ...message, id: anId(60), side: 'owner', text: 'When do you come?' },
      { ...message, id: anId(61), side: 'team', text: 'In June.' },
    ],
  });
  const { calls } = show(
    { matters: [answered] },
    { [`POST ${OWN}/matters/${anId(50)}/messages`]: aMatter() },
  );
  fireEvent.click(await screen.findByText('The day'));
  screen.getByText('Your question. Answered.');
  screen.getByText('In June.');
  fireEvent.change(screen.getByLabelText('Write again about this'), {
    target: { value: 'Early?' },
  });
  fireEvent.click(screen.getByRole('button', { name: 'Send' }));
  await screen.findByText('Thank you. It is with us.');
  expect(calls.find(({ route }) => route.startsWith('POST'))?.body).toMatchObject({
    text: 'Early?',
  });
});

test('a further message takes photographs: announced with it, then sent one by one', async () => {
  const upload = vi.mocked(apiUpload).mockResolvedValue({ id: anId(70) });
  const { calls } = show(
    { matters: [aMatter({ kind: 'concern', title: 'A crack' })] },
    { [`POST ${OWN}/matters/${anId(50)}/messages`]: aMatter({ kind: 'concern' }) },
  );
  fireEvent.click(await screen.findByText('A crack'));
  const photo = new File(['seen'], 'crack.jpg', { type: 'image/jpeg' });
  fireEvent.change(
    screen.getByLabelText('Add a photograph from this device', { selector: 'input' }),
    {
      target: { files: [photo] },
    },
  );
  fireEvent.change(await screen.findByLabelText('What it shows'), {
    target: { value: 'Above the door' },
  });
  fireEvent.change(screen.getByLabelText('Write again about this'), {
    target: { value: 'It has grown.' },
  });
  expect(await axeFaults()).toEqual([]);
  fireEvent.click(screen.getByRole('button', { name: 'Send' }));
  await screen.findByText('Thank you. It is with us.');
  const sent = ownMessageSchema.parse(calls.find(({ route }) => route.startsWith('POST'))?.body);
  expect(sent.photographs).toMatchObject([{ caption: 'Above the door' }]);
  const place = `${OWN}/matters/${anId(50)}/photographs/${sent.photographs[0]?.id ?? ''}`;
  expect(upload.mock.calls.map(([{ path }]) => path)).toEqual([place]);
  expect(screen.queryByLabelText('What it shows')).toBeNull();
});

/** What is on the page as sentences, each ended. */
function pageWords(): string {
  return [...document.querySelectorAll('h1, h2, p, li, label, figcaption, button')]
    .map(({ textContent }) => textContent.trim())
    .filter((words) => words !== '')
    .map((words) => (/[.?!]$/.test(words) ? words : `${words}.`))
    .join(' ');
}

test('all of the page with each of its forms is plain English', async () => {
  const measures = [{ title: 'Props in the cellar', state: 'agreed' } as const];
  const decision = 'We have looked at it closely. It is to be protected.';
  const letters = [aLetter('2026-12-02T09:00:00.000Z')];
  show({
    own: anOwn({ letters, buildings: [aBuilding({ measures, decision })] }),
    appointments: [anAppointment()],
    matters: [aMatter()],
  });
  fireEvent.click(await screen.findByRole('button', { name: 'Pick another day' }));
  const links = ['Ask a question', 'Report a crack or a worry', 'How sure are you?', 'Something about my building is wrong', 'Make a claim']; // prettier-ignore
  for (const name of links) {
    fireEvent.click(screen.getByRole('button', { name }));
    const ease = readingEase(pageWords());
    process.stdout.write(`Flesch ${ease.toFixed(0)}: the page with “${name}”\n`);
    expect(ease).toBeGreaterThanOrEqual(60);
  }
});
