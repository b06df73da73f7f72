import { fireEvent, screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { RunExport } from '../../../../src/features/runs/components/run-export.tsx';
import { anId } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';
import { aRunAnswer } from '../../../support/run-answers.ts';

it('offers the run that is shown as a workbook and with footprints', async () => {
  fakeApi({ 'GET /api/session': undefined });
  renderPage(
    <main>
      <h1>Plan</h1>
      <RunExport schemeId={anId(10)} run={aRunAnswer({ number: 3, buildings: 23_400 })} />
    </main>,
  );
  fireEvent.click(screen.getByRole('button', { name: 'Export run 3' }));
  screen.getByText('Run 3: 23 400 buildings, as recorded');
  const links = screen.getAllByRole('link').map((link) => link.getAttribute('href'));
  const path = `/api/schemes/${anId(10)}/runs/${anId(60)}/export`;
  expect(links).toEqual([`${path}?format=xlsx`, `${path}?format=geojson`]);
  expect(await axeFaults()).toEqual([]);
});
