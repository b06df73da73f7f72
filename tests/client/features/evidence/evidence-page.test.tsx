import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { Refusal } from '../../../support/fake-api.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { EVIDENCE_SCHEME, showEvidence } from '../../../support/evidence-page.tsx';

const BUSY = /Arrow keys or the mouse move the frame/;

function field(label: string): HTMLInputElement {
  return screen.getByRole<HTMLInputElement>('textbox', { name: (name) => name.startsWith(label) });
}

function write(label: string, value: string): void {
  fireEvent.change(field(label), { target: { value } });
}

function faultOf(label: string): string {
  const ids = field(label).getAttribute('aria-describedby')?.split(' ') ?? [];
  return ids.map((id) => document.getElementById(id)?.textContent ?? '').join(' ');
}

/** All words on a sheet. */
function wordsOf(sheet: HTMLElement): string[] {
  return [...sheet.querySelectorAll('text')].map(({ textContent }) => textContent);
}

const CATEGORIES = ['Negligible', 'Very slight', 'Slight', 'Moderate', 'Severe to very severe'];

/** How many buildings a sheet says to be in each category. */
function categoryFigures(words: readonly string[]): (string | undefined)[] {
  return CATEGORIES.map((name) => words[words.indexOf(name) + 1]);
}

describe('the page of evidence', () => {
  it('leads to the Plan where nothing has been worked out', async () => {
    showEvidence({ answers: { [`GET ${EVIDENCE_SCHEME}/runs`]: [] } });
    await screen.findByText(/^Nothing has been worked out yet\./);
    expect(screen.getByRole('link', { name: 'Go to the Plan' })).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
  });

  it('is not for who may not read evidence', () => {
    showEvidence({ abilities: { readEvidence: false } });
    expect(screen.getByText('Evidence is for those who work on the scheme.')).toBeTruthy();
  });

  it('shows the sheet as it will be printed, with its title and how many stand in each category', async () => {
    showEvidence();
    const sheet = await screen.findByRole('application', { name: BUSY });
    const words = wordsOf(sheet);
    expect(words).toContain('Buildings by damage category');
    expect(words).toContain('B0007');
    expect(words).toContain('1 : 1\u2009250');
    expect(categoryFigures(words)).toEqual(['0', '0', '1', '0', '0']);
    write('Title', 'The quay as it stands');
    await waitFor(() => {
      expect(wordsOf(sheet).join(' ')).toContain('The quay as it stands');
    });
    expect(await axeFaults()).toEqual([]);
  });

  it('says beside the field what is wrong, and shows and prints nothing meanwhile', async () => {
    showEvidence();
    await screen.findByRole('application', { name: BUSY });
    write('Scale 1 :', '10');
    expect(faultOf('Scale 1 :')).toContain('At least 1 : 50.');
    await screen.findByText('Mend what is marked to see the sheet.');
    expect(screen.queryByRole('button', { name: 'Print' })).toBeNull();
    fireEvent.click(screen.getByRole('button', { name: '1 : 500' }));
    await screen.findByRole('application', { name: BUSY });
    expect(screen.getByRole('button', { name: 'Print' })).toBeTruthy();
  });

  it('marks a series that begins beyond the end of the line', async () => {
    showEvidence();
    fireEvent.click(await screen.findByRole('button', { name: 'Strip series' }));
    write('From chainage', '5000');
    await waitFor(() => {
      expect(faultOf('From chainage')).toContain('The stretch begins where the line has ended.');
    });
    expect(screen.getByText('Mend what is marked to see the sheet.')).toBeTruthy();
  });

  it('turns to the next sheet of a series, and no further than the last', async () => {
    showEvidence();
    fireEvent.click(await screen.findByRole('button', { name: 'Strip series' }));
    const turning = within(await screen.findByRole('group', { name: 'Sheet' }));
    const first = wordsOf(await screen.findByRole('img'));
    expect(turning.queryByRole('button', { name: 'Previous' })).toBeNull();
    fireEvent.click(turning.getByRole('button', { name: 'Next' }));
    expect(turning.getByText(/^Sheet/).textContent).toMatch(/^Sheet 2 of \d+$/);
    await waitFor(() => {
      expect(wordsOf(screen.getByRole('img'))).not.toEqual(first);
    });
    write('To chainage', '10');
    await waitFor(() => {
      expect(screen.queryByRole('group', { name: 'Sheet' })).toBeNull();
    });
  });

  it('moves what a plan shows with the arrow keys, a centimetre of paper at a time', async () => {
    showEvidence();
    const sheet = await screen.findByRole('application', { name: BUSY });
    expect([field('Easting of the middle').value, field('Northing of the middle').value]).toEqual([
      '0',
      '0',
    ]);
    fireEvent.keyDown(sheet, { key: 'ArrowRight' });
    expect(field('Easting of the middle').value).toBe('12.5');
    await waitFor(() => {
      fireEvent.keyDown(sheet, { key: 'ArrowUp' });
      expect(field('Northing of the middle').value).toBe('12.5');
    });
  });

  it('moves what a plan shows by hand, unless Escape gives it up', async () => {
    showEvidence();
    const sheet = await screen.findByRole('application', { name: BUSY });
    sheet.setPointerCapture = () => undefined;
    const drag = () => {
      fireEvent.pointerDown(sheet, { button: 0, clientX: 10, clientY: 10 });
      fireEvent.pointerMove(sheet, { clientX: 12, clientY: 10 });
    };
    drag();
    fireEvent.keyDown(sheet, { key: 'Escape' });
    fireEvent.pointerUp(sheet, { clientX: 12, clientY: 10 });
    expect(field('Easting of the middle').value).toBe('0');
    drag();
    fireEvent.pointerUp(sheet, { clientX: 12, clientY: 10 });
    // pulled to the right: the middle of the frame goes west
    expect(Number(field('Easting of the middle').value)).toBeLessThan(0);
  });

  it('says where what stands on the sheet does not come', async () => {
    showEvidence({
      answers: {
        [`GET ${EVIDENCE_SCHEME}/runs/00000000-0000-4000-8000-000000000060/evidence`]: new Refusal(
          400,
          'validation',
          'There are too many buildings.',
        ),
      },
    });
    await screen.findByText('What stands on the sheet did not come.');
  });

  it('has no sheet of a schedule', async () => {
    showEvidence();
    fireEvent.click(await screen.findByRole('button', { name: 'Schedule' }));
    await screen.findByText(/^A schedule is a table over as many pages as it needs\./);
    expect(screen.queryByLabelText('Scale 1 :')).toBeNull();
    expect(screen.getByRole('button', { name: 'Print' })).toBeTruthy();
  });
});
