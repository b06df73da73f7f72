import { fireEvent, screen, within } from '@testing-library/react';
import { useLocation } from 'react-router-dom';
import { beforeEach, expect, it } from 'vitest';
import { RegisterPage } from '../../../../src/features/register/register-page.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { PersonContext } from '../../../../src/features/session/person-context.ts';
import { aCrsAnswer, anId, aRegisterRow, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';
import { aFunnel, aRunDetail } from '../../../support/run-answers.ts';

const SCHEME = `/api/schemes/${anId(10)}`;
const RUN = anId(60);
const PERSON = { id: anId(), name: 'Assessor', email: 'a@example.org', isAdministrator: false };

const ROWS = [
  aRegisterRow({
    ...{ stage: 3, categoryLow: 1, category: 2, categoryHigh: 3, strain: 0.0975 },
    ...{ settlement: 21.06, slope: 1.2, reserve: -0.125, settled: 'sensitive', heldBy: 'listed' },
  }),
  aRegisterRow({ id: 2, reference: 'B0002', stage: 1, settlement: 0.04, slope: 0 }),
  aRegisterRow({ id: 3, reference: 'B0003' }),
];

function Address() {
  return <output data-testid="address">{decodeURIComponent(useLocation().search)}</output>;
}

async function openRegister(path = '/'): Promise<void> {
  fakeApi({
    [`GET ${SCHEME}/register`]: { rows: ROWS, found: 3, all: 3, version: 1, run: RUN },
    [`GET ${SCHEME}/register/choices/category`]: [
      { value: null, count: 7 },
      { value: '4', count: 2 },
    ],
    [`GET ${SCHEME}/register-views`]: [],
    [`GET ${SCHEME}/runs/${RUN}`]: aRunDetail(),
    [`GET ${SCHEME}/runs`]: [],
    [`GET ${SCHEME}/funnel`]: aFunnel(RUN),
    [`GET ${SCHEME}/extent`]: {
      ...{ bounds: [0, 50, 1, 51], home: [0, 50, 1, 51], crs: 32631, from: 'buildings' },
    },
    [`GET ${SCHEME}/background`]: [],
    [`GET ${SCHEME}`]: aSchemeAnswer(),
    'GET /api/crs/32631': aCrsAnswer(),
    'GET /api/waiting': [],
  });
  renderPage(
    <PersonContext value={{ ...PERSON, demo: false }}>
      <SchemeContext value={aSchemeAnswer({ abilities: { readRegister: true } })}>
        <RegisterPage />
        <Address />
      </SchemeContext>
    </PersonContext>,
    path,
  );
  await screen.findByText('B0001');
}

function cellsOf(reference: string): (string | null)[] {
  const row = screen.getByText(reference).closest('tr') ?? document.body;
  return within(row)
    .getAllByRole('cell')
    .slice(2, 9)
    .map(({ textContent }) => textContent);
}

beforeEach(() => {
  // jsdom draws no map
  localStorage.setItem(`groundsill.register-map.${PERSON.id}`, 'false');
});

it('shows what the run found, what was let go before, and what was not in it', async () => {
  await openRegister();
  expect(cellsOf('B0001')).toEqual([
    ...['3', 'Category 2, slight', 'Category 3, moderate'],
    ...['0.0975', '21.1', '\u22120.13', 'listed'],
  ]);
  const letGo = '–none: let go at stage 1, or not worked out';
  expect(cellsOf('B0002')).toEqual(['1', letGo, letGo, letGo, '0.0', letGo, '']);
  expect(cellsOf('B0003')).toEqual(Array.from({ length: 7 }, () => '–not in the run'));
  expect(screen.getByRole('columnheader', { name: 'Category central' })).toBeTruthy();
  expect(await screen.findByText(/^Results of run 1, A, version 1, /)).toBeTruthy();
  expect(await axeFaults()).toEqual([]);
});

it('counts by stage, state and category, and each number leads to those buildings', async () => {
  await openRegister('/?filter={"search":"quay"}');
  const counts = await screen.findByRole('navigation', { name: 'What run 1 found' });
  await within(counts).findByRole('link', { name: 'listed 2' });
  expect(
    within(counts)
      .getAllByRole('link')
      .map(({ textContent }) => textContent),
  ).toEqual([
    ...['Category 0, negligible 2', 'Category 1, very slight 2', 'Category 2, slight 1'],
    ...['Category 3, moderate 0', 'Category 4–5, severe to very severe 0', 'Sensitive 3'],
    ...['listed 2', 'Mine 4'],
  ]);
  const funnel = await screen.findByRole('navigation', { name: 'Stages and states' });
  expect(
    within(funnel)
      .getAllByRole('link')
      .map(({ textContent }) => textContent),
  ).toEqual([
    ...['195Stage 1, screening', '190 to decide', '5 waiting for check'],
    ...['3Stage 2, strain', '3 to decide', '2Stage 3, detailed', '2 to decide'],
  ]);
  fireEvent.click(within(funnel).getByRole('link', { name: '5 waiting for check' }));
  expect(screen.getByTestId('address').textContent).toBe(
    '?filter={"any":{"stage":["1"],"state":["waiting+for+check"]}}',
  );
  fireEvent.click(within(funnel).getByRole('link', { name: /Stage 3/ }));
  expect(screen.getByTestId('address').textContent).toBe('?filter={"any":{"stage":["3"]}}');
  const link = await within(funnel).findByRole('link', { current: true });
  expect(link.textContent).toBe('2Stage 3, detailed');
  expect(screen.getByRole('button', { name: 'Stage: 3' })).toBeTruthy();
});

it('offers categories by name and none', async () => {
  await openRegister('/?filter={"any":{"category":["4"]}}');
  fireEvent.click(
    await screen.findByRole('button', { name: 'Category central: 4–5 severe to very severe' }),
  );
  expect(await screen.findByLabelText('none')).toBeTruthy();
  fireEvent.click(screen.getByLabelText('none'));
  expect(screen.getByTestId('address').textContent).toContain('"category":["4",null]');
});
