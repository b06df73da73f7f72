import { fireEvent, screen, waitFor } from '@testing-library/react';
import type { ReactNode } from 'react';
import { Route, Routes } from 'react-router-dom';
import { expect, test } from 'vitest';
import { DEFAULT_TEMPLATES } from '../../../../shared/presentation/letter-templates.ts';
import {
  batchPreviewSchema,
  newBatchSchema,
  type Batch,
} from '../../../../shared/schemas/letter-batches.ts';
import { LETTER_KINDS } from '../../../../shared/schemas/letter-settings.ts';
import { templatePreviewSchema } from '../../../../shared/schemas/letter-templates.ts';
import { BatchPage } from '../../../../src/features/letters/batch-page.tsx';
import { NewBatchPage } from '../../../../src/features/letters/new-batch-page.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const SCHEME = `/api/schemes/${anId(10)}`;
const ADA = {
  ...{ partyId: anId(70), name: 'Ada', channel: 'e-mail', reasons: [], leftOut: null },
  earlier: [],
};
const PREPARE = `POST ${SCHEME}/letter-batches`;

const RETURNED: Batch = {
  ...{ id: anId(80), number: 4, kind: 'free text', state: 'returned', letters: 1, byPost: 0 },
  ...{ templateVersion: 0, settingsVersion: 0, runNumber: 1, deliveries: null },
  ...{ preparedBy: 'Bo', preparedById: anId(1), preparedAt: '2026-12-01T09:00:00.000Z' },
  ...{ checkedBy: 'Cy', checkedAt: '2026-12-01T10:00:00.000Z', comment: 'Mended with a d.' },
  ...{ sentBy: null, sentAt: null, printedAt: null },
};

const LEFT_OUT = [{ partyId: anId(71), name: 'Bo', why: 'Was told in person.' }];
const CHOSEN = [
  { partyId: ADA.partyId, name: 'Ada', why: 'Asked for it.' },
  { partyId: null, name: 'Cy', why: 'Lived there.' },
];

const EARLIER = [
  { batchNumber: 6, sentAt: null, buildings: ['3 Middle Row'] },
  { batchNumber: 2, sentAt: '2026-11-20T09:00:00.000Z', buildings: ['3 Middle Row'] },
];
const HAD = 'waits in batch 6, for 3 Middle Row; on 20 Nov 2026 in batch 2, for 3 Middle Row';

function found(recipients: object[] = [ADA]) {
  return { letters: 1, byMail: 1, byPost: 0, runNumber: 1, without: 0, recipients };
}

function show(
  page: ReactNode = <NewBatchPage />,
  path = '/',
  preview: object | ((body: unknown) => unknown) = found(),
) {
  const abilities = { readScheme: true, readLetters: true, prepareLetters: true };
  const api = fakeApi({
    [`${PREPARE}/preview`]: preview,
    [`GET ${SCHEME}/letter-templates`]: LETTER_KINDS.map((kind) => ({
      ...{ kind, version: 0, ...DEFAULT_TEMPLATES[kind], by: null, at: null },
    })),
    [`POST ${SCHEME}/letter-templates/free%20text/preview`]: (body: unknown) => {
      const { subject, body: words } = templatePreviewSchema.parse(body);
      const letter = { name: 'Ada', subject: `As read: ${subject}`, parts: [words] };
      return { faults: [], parties: [{ id: ADA.partyId, name: 'Ada' }], letter };
    },
    [PREPARE]: () => new Refusal(409, 'conflict', 'By now 2 would get the letter, not 1.'),
    [`GET ${SCHEME}/letter-batches/${RETURNED.id}`]: {
      ...{ batch: RETURNED, text: { subject: 'The lift', body: 'It is mendet.' } },
      ...{ letters: [], earlier: [], leftOut: LEFT_OUT, chosen: CHOSEN },
    },
    [`GET ${SCHEME}`]: aSchemeAnswer({ abilities }),
  });
  renderPage(<SchemeContext value={aSchemeAnswer({ abilities })}>{page}</SchemeContext>, path);
  return api;
}

async function sent(calls: ReturnType<typeof show>['calls']) {
  return waitFor(() => {
    const call = calls.find(({ route }) => route === PREPARE);
    expect(call).toBeDefined();
    return newBatchSchema.parse(call?.body);
  });
}

test('free text is written with its batch, looked at as it is read, and kept when it is refused', async () => {
  const { calls } = show();
  fireEvent.change(await screen.findByLabelText('Kind of letter'), {
    target: { value: 'free text' },
  });
  const subject = await screen.findByLabelText<HTMLInputElement>('Subject');
  expect(subject.value).toBe(DEFAULT_TEMPLATES['free text'].subject);
  fireEvent.change(subject, { target: { value: 'The lift at {place}' } });
  fireEvent.change(screen.getByLabelText(/^Letter/), { target: { value: 'It is mended.' } });
  await screen.findByText('As read: The lift at {place}');
  expect(await axeFaults(document.body)).toEqual([]);
  fireEvent.click(await screen.findByRole('button', { name: 'Write 1 letter' }));
  expect(await sent(calls)).toMatchObject({
    kind: 'free text',
    text: { subject: 'The lift at {place}', body: 'It is mended.' },
  });
  await screen.findByText('No letter was written.');
  expect(subject.value).toBe('The lift at {place}');
});

test('other kinds go by their template and are not written here', async () => {
  const { calls } = show();
  fireEvent.click(await screen.findByRole('button', { name: 'Write 1 letter' }));
  expect(await sent(calls)).toMatchObject({ kind: 'first information', text: null });
  expect(screen.queryByLabelText('Subject')).toBeNull();
});

const BATCHES = (
  <Routes>
    <Route path="/schemes/:schemeId/owners/letters/new" element={<NewBatchPage />} />
    <Route path="/schemes/:schemeId/owners/letters/:batchId" element={<BatchPage />} />
  </Routes>
);
const OF_RETURNED = `/schemes/${anId(10)}/owners/letters/${RETURNED.id}`;

test('somebody chosen by hand who cannot get a letter is told of and taken back', async () => {
  const fault = 'Ada has no interest in a building today.';
  show(BATCHES, OF_RETURNED, (body) =>
    batchPreviewSchema.parse(body).chosen.length > 0
      ? new Refusal(422, 'invalid-input', fault)
      : found([]),
  );
  fireEvent.click(await screen.findByRole('link', { name: 'Prepare these letters again' }));
  await screen.findByText((words) => words.includes(fault));
  fireEvent.click(screen.getByRole('button', { name: 'Take back who was chosen last' }));
  await waitFor(() => {
    expect(screen.queryByText((words) => words.includes(fault))).toBeNull();
  });
});

test('a returned batch is prepared again with its text, who was chosen and left out, and what its check said', async () => {
  const { calls } = show(BATCHES, OF_RETURNED);
  fireEvent.click(await screen.findByRole('link', { name: 'Prepare these letters again' }));
  const body = await screen.findByDisplayValue('It is mendet.');
  expect(
    screen.getByText(
      'Batch 4 is prepared again, with its text and 1 party chosen by hand and 1 party left out. ' +
        '1 who had been chosen by hand cannot get a letter any more. ' +
        'Its check said: “Mended with a d.”',
    ),
  ).toBeTruthy();
  fireEvent.change(body, { target: { value: 'It is mended.' } });
  fireEvent.click(await screen.findByRole('button', { name: 'Write 1 letter' }));
  expect(await sent(calls)).toMatchObject({
    kind: 'free text',
    text: { subject: 'The lift', body: 'It is mended.' },
    leftOut: [{ partyId: anId(71), why: 'Was told in person.' }],
    chosen: [{ partyId: ADA.partyId, why: 'Asked for it.' }],
  });
});

test('who had the letter already is marked and counted, and is left out at once with a reason', async () => {
  const dee = { ...ADA, partyId: anId(72), name: 'Dee', earlier: EARLIER };
  const { calls } = show(<NewBatchPage />, '/', found([ADA, dee]));
  await screen.findByText(/^1 of them had a letter of this kind for the same building/);
  expect(screen.getByText(HAD)).toBeTruthy();
  expect(await axeFaults(document.body)).toEqual([]);
  fireEvent.click(screen.getByRole('button', { name: 'Leave this one out…' }));
  expect(await screen.findByText('No letter of this batch: Dee')).toBeTruthy();
  fireEvent.click(screen.getByRole('button', { name: 'Leave them out' }));
  await waitFor(() => {
    const leftOut = [{ partyId: dee.partyId, why: 'Had this letter already.' }];
    expect(calls.at(-1)?.body).toMatchObject({ leftOut, chosen: [] });
  });
});

test('whoever checks a batch sees which of its letters somebody had already', async () => {
  const letter = {
    ...{ id: anId(90), number: 1, name: 'Dee', channel: 'post', delivery: 'not sent' },
    ...{ serverWords: null, answerBy: null, acknowledgedAt: null, remindedAt: null },
    ...{ batchNumber: 4, kind: 'free text', batchId: RETURNED.id },
  };
  fakeApi({
    [`GET ${SCHEME}/letter-batches/${RETURNED.id}`]: {
      ...{ batch: RETURNED, text: null, letters: [letter], leftOut: LEFT_OUT, chosen: CHOSEN },
      earlier: [{ letterId: letter.id, had: EARLIER }],
    },
  });
  renderPage(
    <SchemeContext value={aSchemeAnswer({ abilities: { readLetters: true } })}>
      <Routes>
        <Route path="/:batchId" element={<BatchPage />} />
      </Routes>
    </SchemeContext>,
    `/${RETURNED.id}`,
  );
  expect(await screen.findByText(HAD)).toBeTruthy();
  expect(
    screen.getByText(
      '1 letter of these goes to owners who had a letter of this kind for the same building before, or have it waiting in another batch.',
    ),
  ).toBeTruthy();
  expect(screen.getByText('although no rule names them')).toBeTruthy();
});
