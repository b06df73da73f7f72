import { fireEvent, screen, waitFor } from '@testing-library/react';
import { useState } from 'react';
import { expect, test } from 'vitest';
import { defaultLetterSettings } from '../../../../shared/schemas/letter-settings.ts';
import {
  NO_TIME,
  type WhenDraft,
} from '../../../../src/features/appointments/appointment-draft.ts';
import { WhenFields } from '../../../../src/features/appointments/components/when-fields.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const HERE = Intl.DateTimeFormat().resolvedOptions().timeZone;

function show(timeZone: string, day = '2027-06-09') {
  const settings = { ...defaultLetterSettings('2026-12-01'), timeZone };
  const api = fakeApi({
    [`GET /api/schemes/${anId(10)}/letter-settings`]: { version: 0, settings, by: null, at: null },
  });
  function Form() {
    const [draft, setDraft] = useState({ ...NO_TIME, day });
    const onChange = (some: Partial<WhenDraft>) => {
      setDraft({ ...draft, ...some });
    };
    return <WhenFields draft={draft} faults={{}} onChange={onChange} />;
  }
  renderPage(
    <SchemeContext value={aSchemeAnswer()}>
      <Form />
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

test('that a free day is meant is said of that day alone', async () => {
  show(HERE, '2027-06-12');
  const meant = await screen.findByRole<HTMLInputElement>('checkbox');
  fireEvent.click(meant);
  expect(meant.checked).toBe(true);
  fireEvent.change(screen.getByLabelText('Day'), { target: { value: '2027-06-13' } });
  expect(meant.checked).toBe(false);
});
