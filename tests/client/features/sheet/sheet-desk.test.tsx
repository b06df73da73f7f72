import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { expect, it } from 'vitest';
import { useLocation } from 'react-router-dom';
import { outcomesOfBuildings } from '../../../../shared/assessment/outcomes-of-buildings.ts';
import { resultOfOutcome } from '../../../../shared/assessment/result-of-outcome.ts';
import { runInputs } from '../../../../shared/assessment/run-inputs.ts';
import type { RunBuilding, RunDetail } from '../../../../shared/schemas/runs.ts';
import { listsAtHand } from '../../../../src/config/keys-at-hand.ts';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { SheetDesk } from '../../../../src/features/sheet/components/sheet-desk.tsx';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { aDesign } from '../../../support/designs.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { aRing, someFacts } from '../../../support/register-facts.ts';
import { renderPage } from '../../../support/render-page.tsx';
import { aRunDetail } from '../../../support/run-answers.ts';

const RUN = aRunDetail({
  design: aDesign({
    volumeLoss: { low: 0.01, central: 0.02, high: 0.03 },
    troughWidth: { low: 0.4, central: 0.5, high: 0.6 },
  }),
});

function Address() {
  const { pathname, search } = useLocation();
  return <output aria-label="Address">{`${pathname}${search}`}</output>;
}

function aRunBuilding(north: number, overrides: Partial<RunBuilding> = {}): RunBuilding {
  const known = someFacts({ id: '7', parts: [[aRing(-5, north, 10, 30)]], storeys: null });
  const { design, rules } = RUN;
  const [found] = outcomesOfBuildings(runInputs(design, rules), 0, [known], []);
  if (found === undefined) throw new Error('There is one building.');
  return {
    facts: {
      ...{ reference: 'B0197', name: 'Customs House', address: 'Sill Quay', use: 'offices' },
      ...{ inspected: null, structureReason: null, featuresReason: null, ...known, parts: [[aRing(-5, north, 10, 30).map(([e, n]) => [e, n])]] },
    },
    version: 1,
    changedSince: false,
    rows: [],
    result: resultOfOutcome(found.outcome),
    ...{ previous: null, next: null },
    ...overrides,
  }; // prettier-ignore
}

function show(building: RunBuilding, run: RunDetail = RUN, others: readonly RunBuilding[] = []) {
  const scheme = aSchemeAnswer();
  const path = `/api/schemes/${scheme.id}/runs/${run.id}/buildings`;
  fakeApi({
    ...Object.fromEntries(others.map((one) => [`GET ${path}/${one.facts.id}`, one])),
    'GET /api/session': undefined,
    [`GET /api/schemes/${scheme.id}/runs/${run.id}/contours`]: [
      { level: 0.01, line: [[-50, 12], [50, 12]], isClosed: false },
    ],
    [`GET /api/schemes/${scheme.id}/building-outlines`]: [],
  }); // prettier-ignore
  return renderPage(
    <SchemeContext value={scheme}>
      <Address />
      <SheetDesk schemeId={anId(10)} run={run} building={building} />
    </SchemeContext>,
  );
}

it('shows what a run found of a building, and that it comes out the same again', async () => {
  show(aRunBuilding(2));
  expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('Customs House');
  expect(screen.getByText(/the same figures as recorded, to the last digit/)).toBeDefined();
  expect(screen.getByText(/Over the whole range of volume loss and K/)).toBeDefined();
  expect(screen.getByText(/A visit would settle it/)).toBeDefined();
  expect(screen.getByRole('link', { name: 'PDF' }).getAttribute('href')).toContain('/buildings/7/sheet.pdf'); // prettier-ignore
  expect(screen.getByRole('link', { name: 'The case for assess' }).getAttribute('href')).toContain('/buildings/7/case'); // prettier-ignore
  expect(screen.getByRole('img', { name: /in plan with its walls by letter/ })).toBeDefined();
  expect(await axeFaults()).toEqual([]);
});

it('opens another wall where it is chosen', () => {
  show(aRunBuilding(2));
  const walls = within(screen.getByRole('table', { name: 'Walls' }));
  const row = walls.getByRole('row', { name: /^c / });
  fireEvent.doubleClick(row);
  fireEvent.click(row);
  fireEvent.keyDown(row, { key: 'Enter' });
  expect(screen.getByRole('heading', { name: /^Working of wall c/ })).toBeDefined();
});

it('says of a record that does not come out again that it differs', () => {
  const building = aRunBuilding(2);
  show({ ...building, result: { ...building.result, settlement: 0.5 } });
  expect(screen.getByText(/the figures differ from the record of run 1/)).toBeDefined();
});

it('says of a building that screening lets go why, and of a changed one that it has changed', () => {
  show(aRunBuilding(300, { changedSince: true }));
  expect(screen.getByText('Screening lets it go at stage 1.')).toBeDefined();
  expect(screen.getByText(/The register has changed since/)).toBeDefined();
  const plan = screen.getByRole('img', { name: /in plan with its walls by letter/ });
  expect(plan.querySelector('path.fill-sheet')).not.toBeNull();
});

it('goes to the sheets beside it by buttons and keys, of the same run, but not while writing', async () => {
  const others = [6, 9].map((id) => {
    const { facts, ...found } = aRunBuilding(2);
    return { ...found, facts: { ...facts, id: String(id) } };
  });
  show(aRunBuilding(2, { previous: 6, next: 9 }), RUN, others);
  const address = () => screen.getByRole('status', { name: 'Address' }).textContent;
  const at = (id: number) => `/schemes/${anId(10)}/buildings/${id}/sheet?run=${RUN.id}`;
  const previous = screen.getByRole('link', { name: /^Previous/ });
  expect(previous.getAttribute('href')).toBe(at(6));
  fireEvent.click(screen.getByRole('link', { name: /^Next/ }));
  await waitFor(() => { expect(address()).toBe(at(9)); });
  const field = document.body.appendChild(document.createElement('input'));
  fireEvent.keyDown(field, { key: '[' });
  expect(address()).toBe(at(9));
  field.remove();
  fireEvent.keyDown(document.body, { key: '[' });
  await waitFor(() => { expect(address()).toBe(at(6)); });
  expect(listsAtHand().flat().map(({ keys }) => keys)).toContainEqual(['[', ']']);
}); // prettier-ignore

it('has no sheet before the first', () => {
  show(aRunBuilding(2));
  expect(screen.queryByRole('link', { name: /^Previous/ })).toBeNull();
  fireEvent.keyDown(document.body, { key: '[' });
  expect(screen.getByRole('status', { name: 'Address' }).textContent).toBe('/');
});

it('leads to a page where other values are tried out on the wall that is opened', () => {
  show(aRunBuilding(2));
  const link = screen.getByRole('link', { name: 'Try other values on this wall' });
  expect(link.getAttribute('href')).toMatch(/^\/method\/what-if\?v=2&vh=3&l=30/);
});

it('says of a building that screening lets go what would break it all the same', () => {
  const { leadingCategory, ...rules } = RUN.rules;
  show(aRunBuilding(19), {
    ...RUN,
    rules: { ...rules, leadingCategory: { ...leadingCategory, value: 1 } },
  });
  expect(screen.getByText('Screening lets it go at stage 1.')).toBeDefined();
  expect(screen.getByText(/^Breaks at \d/)).toBeDefined();
});

it('names itself at the foot of each page of paper while it is shown', () => {
  const { unmount } = show(aRunBuilding(2));
  const foot = () => document.documentElement.style.getPropertyValue('--on-every-page');
  expect(foot()).toMatch(
    /^"Sheet B0197 · Port Dogger crossing · A · Run 1, 1 Dec 2026, .* · method 1\.1\.0"$/,
  );
  unmount();
  expect(foot()).toBe('');
});
