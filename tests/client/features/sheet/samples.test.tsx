import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { useLocation } from 'react-router-dom';
import { SAMPLES_CAUTION } from '../../../../shared/presentation/sample-words.ts';
import type { RunBuilding } from '../../../../shared/schemas/runs.ts';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { SheetDesk } from '../../../../src/features/sheet/components/sheet-desk.tsx';
import {
  workSamples,
  type SamplesAsked,
} from '../../../../src/features/sheet/samples/work-samples.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { aRing } from '../../../support/register-facts.ts';
import { renderPage } from '../../../support/render-page.tsx';
import { aSheetMaterial, SHEET_RUN } from '../../../support/sheet-material.ts';

const RUN = SHEET_RUN;
/** Long enough to come into several categories over the ranges. */
const LONG = aSheetMaterial({ parts: [[aRing(-5, 2, 10, 30).map(([e, n]) => [e, n])]] });
const BUILDING: RunBuilding = { ...LONG.building, previous: null, next: null };

/** A thread that draws what it is asked for, or fails. */
function fakeThread(fails = false): { readonly asked: number[] } {
  const seen: { readonly asked: number[] } = { asked: [] };
  class FakeWorker extends EventTarget {
    postMessage(asked: SamplesAsked): void {
      seen.asked.push(asked.seed);
      queueMicrotask(() => {
        this.dispatchEvent(
          fails ? new Event('error') : new MessageEvent('message', { data: workSamples(asked) }),
        );
      });
    }
    terminate(): void {
      return undefined;
    }
  }
  vi.stubGlobal('Worker', FakeWorker);
  return seen;
}

function Address() {
  return <output aria-label="Address">{useLocation().search}</output>;
}

function show(path: string) {
  const scheme = aSchemeAnswer();
  fakeApi({
    'GET /api/session': undefined,
    [`GET /api/schemes/${scheme.id}/runs/${RUN.id}/contours`]: [],
    [`GET /api/schemes/${scheme.id}/building-outlines`]: [],
  });
  return renderPage(
    <SchemeContext value={scheme}>
      <Address />
      <SheetDesk schemeId={anId(10)} run={RUN} building={BUILDING} />
    </SchemeContext>,
    path,
  );
}

function panel() {
  return within(screen.getByRole('region', { name: 'Sampled run' }));
}

function address(): string | null {
  return screen.getByRole('status', { name: 'Address' }).textContent;
}

/** The counts that stand in the table, from category 0 up. */
async function countsShown(): Promise<number[]> {
  const table = await screen.findByRole('table', { name: 'Share of the samples in each category' });
  const rows = within(table).getAllByRole('row');
  return rows.map((row) =>
    parseInt(within(row).getAllByRole('cell').at(-1)?.textContent ?? '', 10),
  );
}

describe('the samples of a sheet', () => {
  let seen: { readonly asked: number[] };
  beforeEach(() => {
    seen = fakeThread();
  });

  it('are not drawn until somebody asks', () => {
    show('/');
    expect(panel().getByText(/Draws volume loss, K and E\/G together/)).toBeDefined();
    expect(panel().queryByRole('table')).toBeNull();
    expect(screen.getByText(/^(Settled|Sensitive)/)).toBeDefined();
    expect(seen.asked).toEqual([]);
    expect(screen.getByRole('link', { name: 'PDF' }).getAttribute('href')).toMatch(/sheet\.pdf$/);
  });

  it('show the share in each category, the strain and the one verdict once they are asked for', async () => {
    show('/');
    fireEvent.click(panel().getByRole('button', { name: 'Draw 500 samples' }));
    const counts = await countsShown();
    expect(counts).toHaveLength(5);
    expect(counts.reduce((sum, count) => sum + count, 0)).toBe(500);
    const { categories = [] } = workSamples({ run: RUN, building: BUILDING, seed: 1 }) ?? {};
    expect(counts).toEqual(categories.map(({ count }) => count));
    expect(counts.filter((count) => count > 0).length).toBeGreaterThan(1);
    expect(panel().getByText('500 samples, seed 1')).toBeDefined();
    expect(panel().getByText(SAMPLES_CAUTION)).toBeDefined();
    expect(screen.getAllByText(/^(Settled|Sensitive)/)).toHaveLength(1);
    expect(panel().getByText(/^Sensitive, most of all to/)).toBeDefined();
    expect(await axeFaults()).toEqual([]);
  });

  it('stand in the address and go with the PDF, and another seed draws again', async () => {
    show(`/?run=${RUN.id}&samples=41`);
    const first = await countsShown();
    expect(screen.getByRole('link', { name: 'PDF' }).getAttribute('href')).toMatch(/\?samples=41$/);
    fireEvent.click(panel().getByRole('button', { name: 'Other seed' }));
    await waitFor(() => { expect(panel().getByText('500 samples, seed 42')).toBeDefined(); }); // prettier-ignore
    expect(address()).toBe(`?run=${RUN.id}&samples=42`);
    expect(await countsShown()).not.toEqual(first);
    expect(seen.asked).toEqual([41, 42]);
  });

  it.each(['', 'x', '-1', '1.5', '4294967296'])('are not drawn for the seed “%s”', (seed) => {
    show(`/?samples=${seed}`);
    expect(panel().getByRole('button', { name: 'Draw 500 samples' })).toBeDefined();
    expect(seen.asked).toEqual([]);
  });

  it('go round after the largest seed', async () => {
    show('/?samples=4294967295');
    await countsShown();
    fireEvent.click(panel().getByRole('button', { name: 'Other seed' }));
    await waitFor(() => { expect(seen.asked).toEqual([4294967295, 0]); }); // prettier-ignore
  });

  it('open what was drawn for a strain and what that comes to', async () => {
    show('/?samples=1');
    await countsShown();
    const name = /working of the strain that 50.% of the samples do not pass/;
    fireEvent.click(panel().getByRole('button', { name }));
    expect(screen.getByText(/^volume loss drawn for ground 1;$/)).toBeDefined();
    expect(screen.getByText(/^K drawn for ground 1;$/)).toBeDefined();
    expect(screen.getAllByText(/McKay, Beckman and Conover 1979/).length).toBeGreaterThan(0);
  });
});

it('says so where the samples cannot be drawn, and keeps the verdict of the bracket', async () => {
  fakeThread(true);
  show('/?samples=1');
  expect((await screen.findByRole('alert')).textContent).toMatch(/could not be drawn/);
  expect(screen.getByText(/^(Settled|Sensitive)/)).toBeDefined();
});
