import { fireEvent, screen, waitFor } from '@testing-library/react';
import { Route, Routes } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import type { PartyImport } from '../../../../shared/schemas/party-imports.ts';
import { PartyImportPage } from '../../../../src/features/parties/party-import-page.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const ONE = `/api/schemes/${anId(10)}/party-imports/${anId(70)}`;
const COUNTS = {
  ...{ rows: 3, 'new party': 2, 'new interest': 0, 'there already': 0, problem: 1 },
  ...{ noted: 0, partiesAdded: 2, partiesCompleted: 0 },
};
const REMARK = 'No building has the reference B99.';
const ROWS = {
  found: 1,
  rows: [{ row: 4, reference: 'B99', name: 'Tenant', outcome: 'problem', remarks: [REMARK] }],
};

function anImport(overrides: Partial<PartyImport> = {}): PartyImport {
  return {
    ...{ id: anId(70), fileName: 'parties.csv', state: 'checked', counts: COUNTS },
    ...{ fileColumns: ['Ref', 'Who'], columns: { reference: 'Ref' }, by: 'Assessor' },
    ...{ sentAt: '2026-12-02T08:00:00.000Z', endedAt: null },
    ...overrides,
  };
}

function openImport() {
  const scheme = aSchemeAnswer({ abilities: { readParties: true, updateParties: true } });
  renderPage(
    <SchemeContext value={scheme}>
      <Routes>
        <Route path="/imports/:partyImportId" element={<PartyImportPage />} />
      </Routes>
    </SchemeContext>,
    `/imports/${anId(70)}`,
  );
}

describe('an import of parties', () => {
  it('says what it comes to, problems first, and takes over the counts that were seen', async () => {
    const { calls } = fakeApi({
      [`GET ${ONE}`]: anImport(),
      [`GET ${ONE}/rows`]: ROWS,
      [`POST ${ONE}/take-over`]: new Refusal(409, 'conflict', 'Check it again.'),
    });
    openImport();
    expect(await screen.findByText(REMARK)).toBeTruthy();
    expect(calls.some(({ route }) => route.endsWith('only=problem'))).toBe(true);
    expect(screen.getByText(/^2 parties are added, 1 row is left out\./)).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
    fireEvent.click(screen.getByRole('button', { name: 'Take over' }));
    expect(await screen.findByText(/Check it again\./)).toBeTruthy();
    const sent = calls.find(({ route }) => route === `POST ${ONE}/take-over`);
    expect(sent?.body).toEqual({ counts: COUNTS });
  });

  it('is checked anew by other columns, each used once', async () => {
    const { calls } = fakeApi({
      [`GET ${ONE}`]: anImport(),
      [`GET ${ONE}/rows`]: ROWS,
      [`PUT ${ONE}/columns`]: anImport(),
    });
    openImport();
    fireEvent.change(await screen.findByLabelText('Name'), { target: { value: 'Ref' } });
    expect(screen.getByText('The report is still by the old columns.')).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Check again' }));
    await waitFor(() => {
      const sent = calls.find(({ route }) => route.startsWith('PUT'));
      expect(sent?.body).toEqual({ columns: { name: 'Ref' } });
    });
  });

  it('that names nobody asks for the columns and cannot be taken over', async () => {
    const nothing = { ...COUNTS, rows: 0, 'new party': 0, problem: 0, partiesAdded: 0 };
    fakeApi({
      [`GET ${ONE}`]: anImport({ counts: nothing }),
      [`GET ${ONE}/rows`]: { found: 0, rows: [] },
    });
    openImport();
    expect(await screen.findByText(/^No row names anybody\./)).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'Take over' })).toBeNull();
  });
});
