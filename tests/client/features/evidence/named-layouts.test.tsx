import { fireEvent, screen, waitFor } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { changeLayoutSchema, newLayoutSchema } from '../../../../shared/schemas/evidence.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { anId } from '../../../support/answers.ts';
import { Refusal } from '../../../support/fake-api.ts';
import { aLayoutAnswer, EVIDENCE_SCHEME, showEvidence } from '../../../support/evidence-page.tsx';

const LAYOUTS = `${EVIDENCE_SCHEME}/layouts`;
const ONE = `${LAYOUTS}/${anId(90)}`;

/** Opens the one layout that there is. */
async function openLayout(): Promise<void> {
  fireEvent.change(await screen.findByLabelText('Named layout'), { target: { value: anId(90) } });
  await screen.findByDisplayValue('Plan of the quay');
}

function write(label: string, value: string): void {
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
}

describe('named layouts', () => {
  it('keeps what is written under a name', async () => {
    const kept: unknown[] = [];
    showEvidence({
      answers: {
        [`POST ${LAYOUTS}`]: (body: unknown) => {
          kept.push(body);
          const { name, layout } = newLayoutSchema.parse(body);
          return aLayoutAnswer({ name, layout });
        },
        [`GET ${LAYOUTS}`]: () => (kept.length === 0 ? [] : [aLayoutAnswer({ name: 'North' })]),
      },
    });
    await screen.findByLabelText('Name of the layout');
    expect(screen.queryByRole('button', { name: /^Keep/ })).toBeNull();
    write('Second line of the title', 'Sheet of the north');
    write('Name of the layout', ' North ');
    fireEvent.click(screen.getByRole('button', { name: 'Keep as a new layout' }));
    const list = await screen.findByLabelText<HTMLSelectElement>('Named layout');
    expect(list.selectedOptions[0]?.textContent).toBe('North');
    expect(kept).toMatchObject([
      { name: 'North', layout: { kind: 'plan', fields: { subtitle: 'Sheet of the north' } } },
    ]);
    // nothing is left to keep
    expect(screen.queryByRole('button', { name: /^Keep/ })).toBeNull();
    expect(await axeFaults()).toEqual([]);
  });

  it('says of a name that is taken that it is, beside it', async () => {
    const message = 'Another layout has this name.';
    showEvidence({
      answers: {
        [`POST ${LAYOUTS}`]: new Refusal(400, 'validation', 'Not kept.', [
          { path: 'name', message },
        ]),
      },
    });
    await screen.findByLabelText('Name of the layout');
    write('Name of the layout', 'North');
    fireEvent.click(screen.getByRole('button', { name: 'Keep as a new layout' }));
    await screen.findByText(message);
  });

  it('opens one with all that it holds, and another name makes another', async () => {
    showEvidence({ answers: { [`GET ${LAYOUTS}`]: [aLayoutAnswer()] } });
    await openLayout();
    expect(screen.getByDisplayValue('500')).toBeTruthy();
    expect(screen.getByLabelText<HTMLInputElement>(/^Easting/).value).toBe('10');
    expect(screen.queryByRole('button', { name: /^Keep/ })).toBeNull();
    write('Name of the layout', 'The quay at dusk');
    expect(screen.getByRole('button', { name: 'Keep as a new layout' })).toBeTruthy();
    fireEvent.change(screen.getByLabelText('Named layout'), { target: { value: '' } });
    expect(screen.getByDisplayValue('Buildings by damage category')).toBeTruthy();
  });

  it('shows what somebody else changed, and keeps mine on top of it', async () => {
    const sent: number[] = [];
    const first = aLayoutAnswer();
    const theirs = aLayoutAnswer({ version: 2, layout: { ...first.layout, paper: 'A4' } });
    showEvidence({
      answers: {
        [`GET ${LAYOUTS}`]: () => [sent.length === 0 ? first : theirs],
        [`PATCH ${ONE}`]: (body: unknown) => {
          const { version, name, layout } = changeLayoutSchema.parse(body);
          sent.push(version);
          return version === 1
            ? new Refusal(409, 'conflict', 'Somebody else changed this layout.')
            : aLayoutAnswer({ version: 3, name, layout });
        },
      },
    });
    await openLayout();
    write('Title', 'Mine');
    fireEvent.click(screen.getByRole('button', { name: 'Keep the layout' }));
    fireEvent.click(await screen.findByRole('button', { name: 'See their change' }));
    expect(screen.getByRole('table', { name: 'Their change' }).textContent).toContain('paperA3A4');
    expect(await axeFaults()).toEqual([]);
    fireEvent.click(screen.getByRole('button', { name: 'Keep mine on top of it' }));
    await waitFor(() => {
      expect(screen.queryByText('The layout was not kept.')).toBeNull();
    });
    expect(screen.getByDisplayValue('Mine')).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Keep the layout' }));
    await waitFor(() => {
      expect(screen.queryByRole('button', { name: 'Keep the layout' })).toBeNull();
    });
    expect(sent).toEqual([1, 2]);
  });

  it('removes one once it is asked twice', async () => {
    let isGone = false;
    showEvidence({
      answers: {
        [`GET ${LAYOUTS}`]: () => (isGone ? [] : [aLayoutAnswer()]),
        [`DELETE ${ONE}`]: () => {
          isGone = true;
        },
      },
    });
    await openLayout();
    fireEvent.click(screen.getByRole('button', { name: 'Remove it' }));
    screen.getByText('What was printed from it stays.');
    fireEvent.click(screen.getByRole('button', { name: 'Remove the layout' }));
    await waitFor(() => {
      expect(screen.queryByLabelText('Named layout')).toBeNull();
    });
    expect(screen.getByDisplayValue('Buildings by damage category')).toBeTruthy();
  });

  it('are only read by who may not prepare evidence', async () => {
    showEvidence({ abilities: {}, answers: { [`GET ${LAYOUTS}`]: [aLayoutAnswer()] } });
    await openLayout();
    write('Title', 'Another');
    expect(screen.queryByLabelText('Name of the layout')).toBeNull();
    expect(screen.queryByRole('button', { name: /^(Keep|Remove it|Print)/ })).toBeNull();
  });
});
