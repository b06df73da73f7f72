import { fireEvent, screen, waitFor } from '@testing-library/react';
import { expect, test } from 'vitest';
import type { Appointment } from '../../../../shared/schemas/appointments.ts';
import { defaultLetterSettings } from '../../../../shared/schemas/letter-settings.ts';
import { AppointmentDialog } from '../../../../src/features/appointments/components/appointment-dialog.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const SCHEME = `/api/schemes/${anId(10)}`;
const APPOINTMENT: Appointment = {
  ...{ id: anId(60), purpose: 'access', startsAt: '2090-06-09T10:00:00.000Z', minutes: 60 },
  building: { id: 4, reference: 'T1-2', name: null, address: null },
  ...{ place: 'Front door', state: 'offered', askedFor: null, version: 3, isMailed: true },
  ...{ party: { id: anId(61), name: 'Ada' }, createdBy: 'Bo' },
  changedAt: '2026-12-01T10:00:00.000Z',
};
const WORDS = 'Saturday 10 June is no working day. The next working day is Monday 12 June.';

test('a free day is refused at the day, with what to do, and goes once it is meant', async () => {
  const settings = defaultLetterSettings('2026-12-01');
  const refusal = new Refusal(422, 'invalid-input', 'Mend what is marked.', [
    { path: 'startsAt', message: WORDS },
  ]);
  const asked: unknown[] = [];
  fakeApi({
    [`GET ${SCHEME}/letter-settings`]: { version: 0, settings, by: null, at: null },
    [`PATCH ${SCHEME}/appointments/${APPOINTMENT.id}`]: (body: unknown) => {
      asked.push(body);
      return asked.length === 1 ? refusal : APPOINTMENT;
    },
  });
  renderPage(
    <SchemeContext value={aSchemeAnswer()}>
      <AppointmentDialog
        schemeId={anId(10)}
        appointment={APPOINTMENT}
        mayChange
        onClose={() => undefined}
      />
    </SchemeContext>,
  );
  fireEvent.change(screen.getByLabelText('Day'), { target: { value: '2090-06-10' } });
  fireEvent.click(screen.getByRole('button', { name: 'Offer this time' }));
  expect(await screen.findByText(WORDS)).toBeTruthy();
  fireEvent.click(screen.getByLabelText('On a weekend or a holiday on purpose'));
  fireEvent.click(screen.getByRole('button', { name: 'Offer this time' }));
  await waitFor(() => {
    expect(asked).toMatchObject([{ isFreeDayMeant: false }, { isFreeDayMeant: true }]);
  });
});
