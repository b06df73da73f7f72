import { fireEvent, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { AuditEntryAnswer } from '../../../../shared/schemas/audit.ts';
import { AuditPage } from '../../../../src/app/routes/audit.tsx';
import { anId, aRulesVersion, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

function anEntry(overrides: Partial<AuditEntryAnswer> = {}): AuditEntryAnswer {
  return {
    id: '2',
    at: '2026-05-21T09:00:00.000Z',
    person: { id: anId(), name: 'Administrator', email: 'administrator@example.org' },
    scheme: { id: anId(10), name: 'Port Dogger crossing' },
    action: 'change scheme',
    subject: { kind: 'scheme', id: anId(10) },
    named: [],
    before: { name: 'Port Dogger' },
    after: { name: 'Port Dogger crossing' },
    ...overrides,
  };
}

const SCHEMES = { 'GET /api/schemes': [aSchemeAnswer()] };

describe('the audit page', () => {
  it('opens a row on its values before and after', async () => {
    fakeApi({ ...SCHEMES, 'GET /api/audit?': { entries: [anEntry()], next: null } });
    renderPage(<AuditPage />);
    fireEvent.click(await screen.findByText('Change scheme'));
    const values = screen.getByRole('table', { name: 'Values of: change scheme' });
    expect(values.textContent).toContain('namePort DoggerPort Dogger crossing');
    expect(await axeFaults()).toEqual([]);
    expect(screen.getByRole('status').textContent).toBe('1 shown, to the first one.');
  });

  it('says when no values go with an entry, and when nobody was signed in', async () => {
    const entry = anEntry({ before: null, after: null, person: null, action: 'reset password' });
    fakeApi({ ...SCHEMES, 'GET /api/audit?': { entries: [entry], next: null } });
    renderPage(<AuditPage />);
    fireEvent.click(await screen.findByText('Reset password'));
    expect(screen.getByText('No values go with this.')).toBeTruthy();
    expect(screen.getByText('nobody signed in')).toBeTruthy();
  });

  it('calls people by name, and says when the demo did it', async () => {
    const designer = { id: anId(20), name: 'Designer', email: 'designer@example.org' };
    const entry = anEntry({
      person: null,
      action: 'change roles',
      subject: { kind: 'person', id: designer.id },
      named: [designer],
      before: { by: designer.id },
      after: { by: 'nobody' },
    });
    fakeApi({ ...SCHEMES, 'GET /api/audit?': { entries: [entry], next: null } });
    renderPage(<AuditPage />);
    fireEvent.click(await screen.findByText('Change roles'));
    expect(screen.getByText('the demo')).toBeTruthy();
    const values = screen.getByRole('table', { name: 'Values of: change roles' });
    expect(values.textContent).toContain('Designer, designer@example.org');
    expect(screen.getByText(/^Entry 2, person Designer, designer@example.org/)).toBeTruthy();
    expect(document.body.textContent).not.toContain(designer.id);
  });

  it('says rules as their page does', async () => {
    const { rules } = aRulesVersion();
    const value = { ...rules.screening.value, settlement: 0.0125 };
    const changed = { ...rules, screening: { ...rules.screening, value } };
    const entry = anEntry({ action: 'change rules', before: { rules }, after: { rules: changed } });
    fakeApi({ ...SCHEMES, 'GET /api/audit?': { entries: [entry], next: null } });
    renderPage(<AuditPage />);
    fireEvent.click(await screen.findByText('Change rules'));
    const values = screen.getByRole('table', { name: 'Values of: change rules' });
    expect(values.textContent).toContain('12.5\u00a0mm and 1 in 500');
  });

  it('fetches older entries when asked', async () => {
    fakeApi({
      ...SCHEMES,
      'GET /api/audit?': { entries: [anEntry()], next: '2' },
      'GET /api/audit?before=2': { entries: [anEntry({ id: '1' })], next: null },
    });
    renderPage(<AuditPage />);
    fireEvent.click(await screen.findByRole('button', { name: 'Show older' }));
    expect(await screen.findByText('2 shown, to the first one.')).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'Show older' })).toBeNull();
  });

  it('shows one scheme alone, and says when there is nothing', async () => {
    fakeApi({
      ...SCHEMES,
      'GET /api/audit?': { entries: [anEntry()], next: null },
      [`GET /api/audit?schemeId=${anId(10)}`]: { entries: [], next: null },
    });
    renderPage(<AuditPage />);
    await screen.findByRole('option', { name: 'Port Dogger crossing' });
    fireEvent.change(screen.getByLabelText('Scheme'), { target: { value: anId(10) } });
    expect(await screen.findByText('Nothing has been changed yet.')).toBeTruthy();
  });
});
