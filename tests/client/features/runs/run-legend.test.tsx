import { fireEvent, screen, within } from '@testing-library/react';
import { expect, it } from 'vitest';
import { RunLegend } from '../../../../src/features/runs/components/run-legend.tsx';
import { useRunView } from '../../../../src/features/runs/hooks/use-run-view.ts';
import { anId } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';
import { aRunAnswer, aRunMap } from '../../../support/run-answers.ts';

const MAP = `GET /api/schemes/${anId(10)}/runs/${anId(60)}/map`;

function Desk({ isShown = true }: { readonly isShown?: boolean }) {
  const view = useRunView(anId(10), aRunAnswer({ isShown }));
  return (
    <main>
      <h1>Plan</h1>
      <RunLegend view={view} isPreview={false} />
      <p>{view.shades === null ? 'no colours' : `${view.shades.size} coloured`}</p>
    </main>
  );
}

function rows(): (string | null)[] {
  return within(screen.getByRole('table'))
    .getAllByRole('row')
    .map(({ textContent }) => textContent);
}

it('counts what the map shows, follows the keys, and keeps to the address', async () => {
  fakeApi({ 'GET /api/session': undefined, [MAP]: aRunMap() });
  renderPage(<Desk />, '/?value=low');
  await screen.findByText('3 coloured');
  expect(rows()).toEqual([
    '0negligible1',
    '1very slight1',
    '2slight1',
    '3moderate0',
    '4–5severe to very severe0',
    'Let go at stage 11',
  ]);
  fireEvent.keyDown(document.body, { key: '3' });
  expect(rows().slice(0, 5).map((row) => row?.at(-1))).toEqual(['0', '1', '1', '0', '1']); // prettier-ignore
  expect(screen.getByRole('button', { name: 'High' }).getAttribute('aria-pressed')).toBe('true');
  expect(await axeFaults()).toEqual([]);
  fireEvent.click(screen.getByRole('button', { name: 'Settlement' }));
  expect(rows()).toContain('50 mm and more1');
  expect(rows().at(-1)).toBe('Under 1 mm1');
  fireEvent.click(screen.getByRole('button', { name: 'Nothing' }));
  await screen.findByText('0 coloured');
});

it('leads from a count to those buildings in the register, unless a later run stands there', async () => {
  fakeApi({ 'GET /api/session': undefined, [MAP]: aRunMap() });
  const { unmount } = renderPage(<Desk />, '/?value=low');
  const link = await screen.findByRole('link', { name: '1 in the register: slight' });
  const filterIn = (one: HTMLElement): unknown =>
    JSON.parse(
      new URLSearchParams(one.getAttribute('href')?.split('?')[1]).get('filter') ?? 'null',
    );
  expect(link.getAttribute('href')).toMatch(new RegExp(`^/schemes/${anId(10)}/register[?]`));
  expect(filterIn(link)).toEqual({ any: { categoryLow: ['2'] } });
  fireEvent.click(screen.getByRole('button', { name: 'Settlement' }));
  const deepest = await screen.findByRole('link', { name: '1 in the register: 50 mm and more' });
  expect(filterIn(deepest)).toEqual({ ranges: { settlement: { from: 50 } } });
  unmount();
  renderPage(<Desk isShown={false} />, '/?value=low');
  await screen.findByText('3 coloured');
  expect(screen.queryByRole('link')).toBeNull();
});

it('says where the figures do not come', async () => {
  fakeApi({ 'GET /api/session': undefined, [MAP]: new Refusal(500, 'unexpected', 'Failed.') });
  renderPage(<Desk />);
  await screen.findByText('What the run found did not come.');
});
