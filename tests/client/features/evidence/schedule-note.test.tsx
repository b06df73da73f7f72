import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { ScheduleNote } from '../../../../src/features/evidence/components/schedule-note.tsx';
import { anId } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';
import { aRunAnswer } from '../../../support/run-answers.ts';

it('leads to the workbook of the run that is chosen', async () => {
  fakeApi({ 'GET /api/session': undefined });
  renderPage(
    <main>
      <h1>Evidence</h1>
      <ScheduleNote schemeId={anId(10)} run={aRunAnswer({ number: 3 })} />
    </main>,
  );
  const link = screen.getByRole('link', { name: 'Download run 3 as XLSX' });
  expect(link.getAttribute('href')).toBe(
    `/api/schemes/${anId(10)}/runs/${anId(60)}/export?format=xlsx`,
  );
  expect(await axeFaults()).toEqual([]);
});
