import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { useLocation } from 'react-router-dom';
import { beforeEach, describe, expect, it } from 'vitest';
import { PersonContext } from '../../../../src/features/session/person-context.ts';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { RegisterPage } from '../../../../src/features/register/register-page.tsx';
import {
  aBuildingAnswer,
  aCrsAnswer,
  anId,
  aRegisterRow,
  aSchemeAnswer,
} from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const SCHEME = `/api/schemes/${anId(10)}`;
const PERSON = { id: anId(), name: 'Assessor', email: 'a@example.org', isAdministrator: false };
const CHANGE = { changeId: anId(90), version: 2, buildingIds: [1] };
const UNDOING = { ...CHANGE, changeId: anId(91) };
const ROWS = [
  aRegisterRow(),
  aRegisterRow({
    id: 2,
    reference: 'B0002',
    name: 'Customs House',
    storeys: null,
    condition: null,
    assumed: ['storeys'],
  }),
  aRegisterRow({ id: 3, reference: 'B0003', address: '12 Net Street' }),
];

/** The register of three buildings; a filter for one condition finds one. */
function page(asked: unknown) {
  const filter = asked instanceof URLSearchParams ? (asked.get('filter') ?? '{}') : '{}';
  const isOne = /poor|unknown/.test(filter);
  const rows = isOne ? ROWS.slice(1, 2) : ROWS;
  return { rows, found: rows.length, all: 3, version: 1, run: null };
}

const ANSWERS = {
  [`GET ${SCHEME}/register`]: page,
  [`GET ${SCHEME}/register/place`]: { index: 1 },
  [`GET ${SCHEME}/register/choices/condition`]: [
    { value: 'good', count: 2 },
    { value: 'poor', count: 1 },
  ],
  [`GET ${SCHEME}/register-views`]: [],
  [`GET ${SCHEME}/buildings/1`]: aBuildingAnswer(),
  [`GET ${SCHEME}/buildings/2`]: aBuildingAnswer({ id: 2, reference: 'B0002' }),
  [`GET ${SCHEME}/extent`]: {
    bounds: [0, 50, 1, 51],
    home: [0, 50, 1, 51],
    crs: 32631,
    from: 'buildings',
  },
  [`GET ${SCHEME}/background`]: [],
  'GET /api/crs/32631': aCrsAnswer(),
  [`GET ${SCHEME}`]: aSchemeAnswer(),
  'GET /api/waiting': [],
};

function Address() {
  const { search } = useLocation();
  return <output data-testid="address">{decodeURIComponent(search)}</output>;
}

function openRegister(abilities: Record<string, boolean> = {}, path = '/') {
  renderPage(
    <PersonContext value={{ ...PERSON, demo: false }}>
      <SchemeContext value={aSchemeAnswer({ abilities: { readRegister: true, ...abilities } })}>
        <RegisterPage />
        <Address />
      </SchemeContext>
    </PersonContext>,
    path,
  );
  return screen.findByText('B0001');
}

function press(key: string): void {
  fireEvent.keyDown(document.activeElement ?? document.body, { key });
}

function address(): string | null {
  return screen.getByTestId('address').textContent;
}

const EDITS = { updateRegister: true };

beforeEach(() => {
  // jsdom draws no map
  localStorage.setItem(`groundsill.register-map.${PERSON.id}`, 'false');
});

describe('the register', () => {
  it('shows what is known, what is assumed and what is not known', async () => {
    fakeApi(ANSWERS);
    await openRegister(EDITS);
    expect(screen.getByText('3 buildings')).toBeTruthy();
    const row = screen.getByText('B0002').closest('tr') ?? document.body;
    expect(within(row).getByText('Customs House')).toBeTruthy();
    expect(within(row).getByTitle('assumed: 2')).toBeTruthy();
    expect(within(row).getByTitle('condition is not known').textContent).toBe('–not known');
    expect(screen.getByRole('columnheader', { name: 'Eaves m' })).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
  });

  it('is filtered by a chip and ordered by a heading, and the address says so', async () => {
    const { calls } = fakeApi(ANSWERS);
    await openRegister(EDITS);
    fireEvent.click(screen.getByRole('button', { name: 'Condition: any' }));
    fireEvent.click(await screen.findByLabelText('poor'));
    expect(await screen.findByText('1 of 3 buildings')).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Storeys' }));
    fireEvent.click(screen.getByRole('button', { name: 'Storeys' }));
    await waitFor(() => {
      expect(address()).toBe('?filter={"any":{"condition":["poor"]}}&sort=-storeys');
    });
    await waitFor(() => {
      const asked = new URLSearchParams(calls.at(-1)?.route.split('?')[1]);
      expect(asked.get('sort')).toBe('{"column":"storeys","descending":true}');
    });
    fireEvent.click(screen.getByRole('button', { name: 'Any condition' }));
    expect(await screen.findByText('3 buildings')).toBeTruthy();
  });

  it('is walked, marked and opened by keys', async () => {
    fakeApi(ANSWERS);
    await openRegister(EDITS);
    press('j');
    press('x');
    press('j');
    press('x');
    expect(screen.getByText('2', { selector: 'b' }).parentElement?.textContent).toBe('2 marked');
    press('x');
    expect(screen.getByText('1', { selector: 'b' }).parentElement?.textContent).toBe('1 marked');
    press('Enter');
    const side = await screen.findByRole('region', { name: 'Opened building' });
    expect(await within(side).findByText('B0002')).toBeTruthy();
    expect(address()).toBe('?building=2');
    press('Escape');
    await waitFor(() => {
      expect(screen.queryByRole('region', { name: 'Opened building' })).toBeNull();
    });
    press('/');
    expect(
      document.activeElement?.ariaLabel ?? document.activeElement?.getAttribute('aria-label'),
    ).toBe('Search the register');
  });

  it('sets values for what is marked after saying what that means, and takes it back', async () => {
    const { calls } = fakeApi({
      ...ANSWERS,
      [`POST ${SCHEME}/buildings/edits/preview`]: [{ field: 'condition', same: 1, unknown: 1 }],
      [`POST ${SCHEME}/buildings/edits`]: CHANGE,
      [`POST ${SCHEME}/register-changes/${CHANGE.changeId}/undo`]: UNDOING,
      [`POST ${SCHEME}/register-changes/${UNDOING.changeId}/undo`]: CHANGE,
    });
    await openRegister(EDITS);
    fireEvent.click(screen.getByLabelText('Mark all 3 found'));
    fireEvent.click(screen.getByRole('button', { name: 'Set values…' }));
    fireEvent.click(screen.getByLabelText('Condition'));
    fireEvent.change(screen.getByRole('combobox', { name: 'Condition' }), {
      target: { value: 'poor' },
    });
    fireEvent.click(screen.getByRole('button', { name: 'Next' }));
    // of the three one has it, and of one it is not known
    const line = 'Set condition to poor for 3 buildings; 1 of them has another value now.';
    expect(await screen.findByText(line)).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Set for 3' }));
    expect(await screen.findByText('Condition set to poor for 3 buildings.')).toBeTruthy();
    const posted = calls.filter(({ route }) => route.startsWith('POST'));
    expect(posted.slice(0, 2).map(({ body }) => body)).toEqual([
      { filter: {}, attributes: { condition: 'poor' } },
      { filter: {}, expected: 3, attributes: { condition: 'poor' } },
    ]);
    fireEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(await screen.findByText(/^Undone: /)).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Redo' }));
    expect(await screen.findByText('Condition set to poor for 3 buildings.')).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Undo' })).toBeTruthy();
  });

  it('removes all that are found in one change, after asking', async () => {
    const { calls } = fakeApi({ ...ANSWERS, [`POST ${SCHEME}/buildings/removals`]: CHANGE });
    await openRegister(EDITS);
    fireEvent.click(screen.getByLabelText('Mark all 3 found'));
    fireEvent.click(screen.getByRole('button', { name: 'Remove…' }));
    const dialog = screen.getByRole('dialog', { name: 'Remove these 3 buildings?' });
    fireEvent.click(within(dialog).getByRole('button', { name: 'Remove 3' }));
    expect(await screen.findByText('3 buildings removed.')).toBeTruthy();
    expect(calls.find(({ route }) => route.startsWith('POST'))?.body).toEqual({
      filter: {},
      expected: 3,
    });
    expect(screen.queryByText('3', { selector: 'b' })).toBeNull();
  });

  it('marks all that are found but some', async () => {
    const { calls } = fakeApi({ ...ANSWERS, [`POST ${SCHEME}/buildings/removals`]: CHANGE });
    await openRegister(EDITS);
    const all = screen.getByLabelText<HTMLInputElement>('Mark all 3 found');
    fireEvent.click(all);
    fireEvent.click(screen.getByLabelText('Mark B0002'));
    expect([all.checked, all.indeterminate]).toEqual([false, true]);
    expect(screen.getByText('2', { selector: 'b' }).parentElement?.textContent).toBe(
      '2 marked, all that are found but 1',
    );
    fireEvent.click(screen.getByRole('button', { name: 'Remove…' }));
    fireEvent.click(screen.getByRole('button', { name: 'Remove 2' }));
    await waitFor(() => {
      expect(calls.find(({ route }) => route.startsWith('POST'))?.body).toEqual({
        filter: { except: [2] },
        expected: 2,
      });
    });
  });

  it('says so where others were marked than are there now, and removes nothing', async () => {
    const message = 'These are 1 buildings now, not 2. Look at them again.';
    const { calls } = fakeApi({
      ...ANSWERS,
      [`POST ${SCHEME}/buildings/removals`]: new Refusal(409, 'conflict', message),
    });
    await openRegister(EDITS);
    for (const name of ['Mark B0001', 'Mark B0003']) fireEvent.click(screen.getByLabelText(name));
    fireEvent.click(screen.getByRole('button', { name: 'Remove…' }));
    fireEvent.click(screen.getByRole('button', { name: 'Remove 2' }));
    expect((await screen.findByRole('alert')).textContent).toBe(`Nothing was removed. ${message}`);
    expect(calls.find(({ route }) => route.startsWith('POST'))?.body).toEqual({
      filter: { ids: [1, 3] },
      expected: 2,
    });
  });

  it('says that buildings are ordered by their address', async () => {
    fakeApi(ANSWERS);
    await openRegister();
    fireEvent.click(screen.getByRole('button', { name: 'Building' }));
    const heading = await screen.findByRole('columnheader', { name: 'Building by address' });
    expect(heading.getAttribute('aria-sort')).toBe('ascending');
  });

  it('keeps an opened building open while it is being changed', async () => {
    fakeApi(ANSWERS);
    await openRegister(EDITS, '/?building=2');
    fireEvent.click(await screen.findByRole('button', { name: 'Edit' }));
    expect(screen.queryByRole('button', { name: 'Close the building' })).toBeNull();
    press('Escape');
    expect(address()).toBe('?building=2');
    expect(await screen.findByRole('button', { name: 'Close the building' })).toBeTruthy();
  });

  it('exports what is seen', async () => {
    fakeApi(ANSWERS);
    await openRegister({}, '/?sort=-area');
    fireEvent.click(screen.getByRole('button', { name: 'Export' }));
    const href = screen.getByRole('link', { name: /XLSX/ }).getAttribute('href') ?? '';
    const words = new URL(href, 'http://x').searchParams;
    expect(words.get('format')).toBe('xlsx');
    expect(words.get('sort')).toBe('{"column":"area","descending":true}');
    expect(words.get('columns')).toContain('"reference","name","address","use","storeys"');
  });

  it('keeps the columns that were chosen', async () => {
    fakeApi(ANSWERS);
    await openRegister();
    fireEvent.click(screen.getByRole('button', { name: 'Columns' }));
    fireEvent.click(screen.getByLabelText('Area in plan'));
    expect(screen.getByRole('columnheader', { name: 'Area m²' })).toBeTruthy();
    expect(localStorage.getItem(`groundsill.register-columns.desk.${PERSON.id}`)).toContain('area');
  });

  it('has no tools for who only reads', async () => {
    fakeApi(ANSWERS);
    await openRegister({}, '/?building=2');
    expect(await screen.findByRole('button', { name: 'History' })).toBeTruthy();
    expect(screen.queryByRole('checkbox')).toBeNull();
    expect(screen.queryByRole('button', { name: 'Edit' })).toBeNull();
    expect(screen.queryByRole('link', { name: 'Bring in…' })).toBeNull();
  });

  it('says how to start where there are no buildings', async () => {
    fakeApi({
      ...ANSWERS,
      [`GET ${SCHEME}/register`]: { rows: [], found: 0, all: 0, version: 1, run: null },
    });
    void openRegister(EDITS).catch(() => undefined);
    expect(
      await screen.findByText('No buildings yet. Bring in footprints to start the register.'),
    ).toBeTruthy();
    expect(screen.getByRole('link', { name: 'Bring in footprints' })).toBeTruthy();
  });

  it('says what did not come, and asks again', async () => {
    fakeApi({ ...ANSWERS, [`GET ${SCHEME}/register`]: new Refusal(500, 'failed', 'It failed.') });
    void openRegister(EDITS).catch(() => undefined);
    expect(await screen.findByText('Some of the register did not come.')).toBeTruthy();
    fakeApi(ANSWERS);
    fireEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('B0001')).toBeTruthy();
  });
});
