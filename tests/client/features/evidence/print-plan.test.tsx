import { fireEvent, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { newPrintSchema } from '../../../../shared/schemas/evidence.ts';
import { PrintPlan } from '../../../../src/features/evidence/components/print-plan.tsx';
import { planAsShown } from '../../../../src/features/evidence/plan-as-shown.ts';
import { anId } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { aPrintAnswer, EVIDENCE_SCHEME } from '../../../support/evidence-page.tsx';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';
import { aRunAnswer } from '../../../support/run-answers.ts';

const ASK = `POST ${EVIDENCE_SCHEME}/runs/${anId(60)}/prints`;
const PRINTS = `GET ${EVIDENCE_SCHEME}/prints`;
const DONE = {
  state: 'done',
  done: 1,
  sheets: 1,
  bytes: 90_000,
  fingerprint: '0123456789abcdef'.repeat(4),
} as const;

function show(
  answers: Readonly<Record<string, unknown>>,
  middle: readonly [number, number] | null = [120.4, -30],
) {
  const api = fakeApi({ 'GET /api/session': undefined, [PRINTS]: [], ...answers });
  renderPage(
    <main>
      <h1>Plan</h1>
      <PrintPlan
        {...{ schemeId: anId(10), run: aRunAnswer(), by: 'category', end: 'high' }}
        middle={() => middle}
      />
    </main>,
  );
  fireEvent.click(screen.getByRole('button', { name: 'Print' }));
  return api;
}

function press(name: string): void {
  fireEvent.click(screen.getAllByRole('button', { name }).at(-1) ?? document.body);
}

describe('printing from the Plan', () => {
  it('takes two clicks: the ground in the middle of the map, coloured as it is', async () => {
    const { calls } = show({
      [ASK]: aPrintAnswer({ state: 'printing', sheets: 1 }),
      [PRINTS]: [aPrintAnswer(DONE)],
    });
    expect(screen.getByLabelText<HTMLSelectElement>('Paper').value).toBe('A3');
    expect(await axeFaults()).toEqual([]);
    press('Print');
    const link = await screen.findByRole('link', { name: 'Download PDF' });
    expect(link.getAttribute('href')).toBe(`${EVIDENCE_SCHEME}/prints/${anId(95)}/file`);
    const asked = newPrintSchema.parse(calls.find(({ route }) => route === ASK)?.body);
    expect(asked.layout).toMatchObject({
      ...{ kind: 'plan', paper: 'A3', denominator: 1250, centre: [120, -30] },
      content: { shows: 'high' },
    });
  });

  it('prints to another scale and says what is wrong with one', async () => {
    const { calls } = show({ [ASK]: aPrintAnswer(DONE), [PRINTS]: [aPrintAnswer(DONE)] });
    fireEvent.change(screen.getByLabelText('Scale 1 :'), { target: { value: '7' } });
    press('Print');
    screen.getByText('At least 1 : 50.');
    expect(calls.map(({ route }) => route)).not.toContain(ASK);
    press('1 : 2500');
    press('Print');
    await screen.findByRole('link', { name: 'Download PDF' });
    const asked = newPrintSchema.parse(calls.find(({ route }) => route === ASK)?.body);
    expect(asked.layout).toMatchObject({ denominator: 2500 });
  });

  it('says why nothing is printed', async () => {
    show({ [ASK]: new Refusal(429, 'too-many', 'Five prints wait already.') });
    press('Print');
    await screen.findByText('Nothing is printed.');
  });

  it('cannot be where the grid does not reach', () => {
    show({}, null);
    screen.getByText(/^The middle of the map lies outside of the scheme’s grid\./);
  });

  it.each([
    ['category', 'low', 'low'],
    ['settlement', 'low', 'settlement'],
    ['stage', 'central', 'stage'],
    ['nothing', 'high', 'central'],
  ] as const)('of a Plan by %s at %s shows %s', (by, end, shows) => {
    expect(planAsShown({ by, end }, [0, 0]).content.shows).toBe(shows);
  });
});
