import { fireEvent, screen, within } from '@testing-library/react';
import { expect, it } from 'vitest';
import { outcomesOfBuildings } from '../../../../shared/assessment/outcomes-of-buildings.ts';
import { resultOfOutcome } from '../../../../shared/assessment/result-of-outcome.ts';
import { runInputs } from '../../../../shared/assessment/run-inputs.ts';
import type { RunBuilding, RunDetail } from '../../../../shared/schemas/runs.ts';
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

function aRunBuilding(north: number, overrides: Partial<RunBuilding> = {}): RunBuilding {
  const known = someFacts({ id: '7', parts: [[aRing(-5, north, 10, 30)]], storeys: null });
  const { design, rules } = RUN;
  const [found] = outcomesOfBuildings(runInputs(design, rules), 0, [known], []);
  if (found === undefined) throw new Error('There is one building.');
  return {
    facts: {
      ...{ reference: 'B0197', name: 'Customs House', address: 'Sill Quay', use: 'offices' },
      ...{ inspected: null, ...known, parts: [[aRing(-5, north, 10, 30).map(([e, n]) => [e, n])]] },
    },
    version: 1,
    changedSince: false,
    rows: [],
    result: resultOfOutcome(found.outcome),
    ...overrides,
  }; // prettier-ignore
}

function show(building: RunBuilding, run: RunDetail = RUN) {
  const scheme = aSchemeAnswer();
  fakeApi({
    'GET /api/session': undefined,
    [`GET /api/schemes/${scheme.id}/runs/${run.id}/contours`]: [
      { level: 0.01, line: [[-50, 12], [50, 12]], isClosed: false },
    ],
    [`GET /api/schemes/${scheme.id}/building-outlines`]: [],
  }); // prettier-ignore
  renderPage(
    <SchemeContext value={scheme}>
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
});
