import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { newPrintSchema, type PrintAnswer } from '../../../../shared/schemas/evidence.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { anId } from '../../../support/answers.ts';
import { Refusal } from '../../../support/fake-api.ts';
import { aPrintAnswer, EVIDENCE_SCHEME, showEvidence } from '../../../support/evidence-page.tsx';

const PRINTS = `${EVIDENCE_SCHEME}/prints`;
const ASK = `POST ${EVIDENCE_SCHEME}/runs/${anId(60)}/prints`;
const DONE = {
  state: 'done',
  done: 2,
  sheets: 2,
  bytes: 1_240_000,
  fingerprint: '0123456789abcdef'.repeat(4),
} as const;

/** A list of prints that the tests change as the server would. */
function showPrints(prints: PrintAnswer[], answers: Readonly<Record<string, unknown>> = {}) {
  return showEvidence({ answers: { [`GET ${PRINTS}`]: () => prints, ...answers } });
}

async function list() {
  return within(await screen.findByRole('list', { name: 'Prints' }));
}

describe('prints', () => {
  it('are asked for as the sheet stands, and can be fetched once they are done', async () => {
    const prints: PrintAnswer[] = [];
    showPrints(prints, {
      [ASK]: (body: unknown) => {
        const { name, layout } = newPrintSchema.parse(body);
        const print = aPrintAnswer({ name, layout, state: 'printing', done: 1, sheets: 2 });
        prints.push(print);
        return print;
      },
    });
    await screen.findByText('Nothing has been printed yet.');
    fireEvent.change(await screen.findByLabelText('Second line of the title'), {
      target: { value: 'North' },
    });
    fireEvent.click(await screen.findByRole('button', { name: 'Print' }));
    const shown = await list();
    shown.getByText('Buildings by damage category, North');
    const progress = shown.getByRole('progressbar', { name: 'Printing' });
    expect(progress.getAttribute('aria-valuetext')).toBe('1 of 2 sheets');
    expect(prints[0]?.layout).toMatchObject({ kind: 'plan', denominator: 1250 });
    prints[0] = aPrintAnswer(DONE);
    // it is asked for again on its own
    const link = await shown.findByRole('link', { name: 'Download PDF' });
    expect(link.getAttribute('href')).toBe(`${PRINTS}/${anId(95)}/file`);
    shown.getByText('2 sheets, 1.2 MB');
    const fingerprint = shown.getByText('Fingerprint 0123 4567 89ab cdef');
    expect(fingerprint.title).toBe(`SHA-256 ${DONE.fingerprint}`);
    expect(await axeFaults()).toEqual([]);
  });

  it('say why nothing is printed', async () => {
    showPrints([], { [ASK]: new Refusal(429, 'too-many', 'Five prints wait already.') });
    fireEvent.click(await screen.findByRole('button', { name: 'Print' }));
    await screen.findByText('Nothing is printed.');
    expect(screen.getByText(/Five prints wait already\./)).toBeTruthy();
  });

  it.each([
    ['that wait', {}],
    ['that are being made', { state: 'printing', done: 0, sheets: 4 } as const],
  ])('%s can be stopped', async (_, overrides) => {
    const prints = [aPrintAnswer(overrides)];
    showPrints(prints, {
      [`POST ${PRINTS}/${anId(95)}/cancel`]: () => {
        prints[0] = aPrintAnswer({ state: 'cancelled' });
        return prints[0];
      },
    });
    const shown = await list();
    fireEvent.click(shown.getByRole('button', { name: 'Cancel' }));
    await waitFor(() => {
      shown.getByText('Stopped.');
    });
    expect(shown.queryByRole('button', { name: 'Cancel' })).toBeNull();
  });

  it('that failed say why in words', async () => {
    showPrints([
      aPrintAnswer({ state: 'failed', fault: 'Sheet 2 has too many buildings.' }),
      aPrintAnswer({ id: anId(96), state: 'failed', askedBy: null }),
    ]);
    const shown = await list();
    shown.getByText('Sheet 2 has too many buildings.');
    shown.getByText('It could not be printed.');
    shown.getByText(/Print 3 of run 1, 2 Dec 2026, .*, somebody who has left$/);
    expect(shown.queryByRole('link')).toBeNull();
  });

  it('say when they do not come', async () => {
    showEvidence({ answers: { [`GET ${PRINTS}`]: new Refusal(500, 'unexpected', 'Failed.') } });
    await screen.findByText('The prints did not come.');
  });
});
