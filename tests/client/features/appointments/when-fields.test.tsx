import { screen, waitFor } from '@testing-library/react';
import { expect, test } from 'vitest';
import { defaultLetterSettings } from '../../../../shared/schemas/letter-settings.ts';
import { NO_TIME } from '../../../../src/features/appointments/appointment-draft.ts';
import { WhenFields } from '../../../../src/features/appointments/components/when-fields.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const HERE = Intl.DateTimeFormat().resolvedOptions().timeZone;

function show(timeZone: string) {
  const settings = { ...defaultLetterSettings('2026-12-01'), timeZone };
  const api = fakeApi({
    [`GET /api/schemes/${anId(10)}/letter-settings`]: { version: 0, settings, by: null, at: null },
  });
  renderPage(
    <SchemeContext value={aSchemeAnswer()}>
      <WhenFields
        draft={{ ...NO_TIME, day: '2027-06-09' }}
        faults={{}}
        onChange={() => undefined}
      />
    </SchemeContext>,
  );
  return api;
}

test('where owners go by other clocks, it says what they will read', async () => {
  show('Pacific/Kiritimati');
  const at = new Date('2027-06-09T10:00').toLocaleTimeString('en-GB', {
    ...{ timeZone: 'Pacific/Kiritimati', hour: '2-digit', minute: '2-digit' },
  } as const);
  const said = await screen.findByText(/The owner reads/);
  expect(said.textContent).toContain(`June 2027, ${at}, as it is in Pacific/Kiritimati.`);
});

test('where they go by the same, nothing is said', async () => {
  const { calls } = show(HERE);
  await waitFor(() => {
    expect(calls).toHaveLength(1);
  });
  expect(screen.queryByText(/The owner reads/)).toBeNull();
});
