import { useQuery } from '@tanstack/react-query';
import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { alignmentsQuery } from '../../../../src/features/alignments/api/list-alignments.ts';
import { GiveUpLine } from '../../../../src/features/alignments/components/give-up-line.tsx';
import { OptionEditorPanel } from '../../../../src/features/alignments/components/option-editor-panel.tsx';
import { useLineKeys } from '../../../../src/features/alignments/hooks/use-line-keys.ts';
import { useOptionEditor } from '../../../../src/features/alignments/hooks/use-option-editor.ts';
import type { AlignmentAnswer } from '../../../../shared/schemas/alignments.ts';
import { anId } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { aDesign } from '../../../support/designs.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const LIST = `/api/schemes/${anId(10)}/alignments`;
const OPTION: AlignmentAnswer = {
  id: anId(50),
  name: 'A',
  version: 1,
  design: aDesign(),
  shafts: [],
  length: 1000,
  changedAt: '2026-12-01T10:00:00.000Z',
  changedBy: 'Ada',
};

type DeskProps = { readonly onSaved: (saved: AlignmentAnswer) => void };

function Desk({ onSaved }: DeskProps) {
  const { data = [] } = useQuery(alignmentsQuery(anId(10)));
  const editor = useOptionEditor(anId(10), data, onSaved);
  const [first = null] = data;
  useLineKeys(editor, editor.isEditing ? null : () => { editor.begin(first, null); }); // prettier-ignore
  return (
    <main>
      <h1>Plan</h1>
      <GiveUpLine editor={editor} />
      {editor.isEditing && <OptionEditorPanel editor={editor} fault={null} />}
      {!editor.isEditing && <p>{data.length} options</p>}
    </main>
  );
}

async function openEditor(options: AlignmentAnswer[], answers: Readonly<Record<string, unknown>>) {
  const onSaved = vi.fn();
  let listed = options;
  const { calls } = fakeApi({
    'GET /api/session': undefined,
    [`GET ${LIST}`]: () => listed,
    ...answers,
  });
  renderPage(<Desk onSaved={onSaved} />);
  await screen.findByText(`${options.length} options`);
  press('a');
  return {
    ...{ calls, onSaved },
    list: (next: AlignmentAnswer[]) => {
      listed = next;
    },
  };
}

function press(key: string, more: KeyboardEventInit = {}): void {
  fireEvent.keyDown(document.body, { key, ...more });
}

function write(label: string | RegExp, value: string): void {
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
}

function addPoint(east: string, north: string): void {
  write('Easting', east);
  write('Northing', north);
  fireEvent.click(screen.getByRole('button', { name: 'Add point' }));
}

function save(): void {
  fireEvent.click(screen.getByRole('button', { name: 'Save' }));
}

describe('a new option', () => {
  it('is drawn in figures, undone, ended, and told what is missing at its fields', async () => {
    const { calls } = await openEditor([], {});
    await screen.findByRole('heading', { name: 'New option' });
    addPoint('0', '0');
    addPoint('100', '0');
    addPoint('200', '50');
    expect(screen.getByLabelText('Point 3, northing')).toBeTruthy();
    press('z', { ctrlKey: true });
    expect(screen.queryByLabelText('Point 3, northing')).toBeNull();
    press('Z', { ctrlKey: true, shiftKey: true });
    expect(screen.getByLabelText('Point 3, northing')).toBeTruthy();
    press('Backspace');
    press('Enter');
    expect(screen.getByRole('button', { name: 'Draw on from the end' })).toBeTruthy();
    save();
    await screen.findByText('Give the option a name.');
    expect(screen.getByLabelText(/^Diameter/).getAttribute('aria-invalid')).toBe('true');
    expect(screen.getByLabelText('Level 1, m').getAttribute('aria-invalid')).toBe('true');
    expect(await axeFaults()).toEqual([]);
    expect(calls.filter(({ route }) => route.startsWith('POST'))).toEqual([]);
  });
});

describe('an option that is there', () => {
  it('is given shafts, each with its source, which are sent beside its design', async () => {
    const { calls, onSaved } = await openEditor([OPTION], {
      [`PATCH ${LIST}/${OPTION.id}`]: { ...OPTION, version: 2 },
    });
    fireEvent.click(await screen.findByRole('button', { name: 'Add a shaft' }));
    write('Name of shaft 1', 'East shaft');
    write('Easting of shaft 1, m', '600');
    save();
    await screen.findByText('Say where this comes from.');
    expect(screen.getByLabelText('Northing of shaft 1, m').getAttribute('aria-invalid')).toBe(
      'true',
    );
    expect(await axeFaults()).toEqual([]);
    write('Northing of shaft 1, m', '5.5');
    write('Source of shaft 1', 'Drawing 12');
    save();
    await waitFor(() => {
      expect(onSaved).toHaveBeenCalled();
    });
    expect(calls.find(({ route }) => route.startsWith('PATCH'))?.body).toMatchObject({
      ...{ version: 1, design: OPTION.design },
      shafts: [{ name: 'East shaft', east: 600, north: 5.5, source: 'Drawing 12' }],
    });
  });

  it('is changed on top of the version that was seen, volume losses in %', async () => {
    const { calls, onSaved } = await openEditor([OPTION], {
      [`PATCH ${LIST}/${OPTION.id}`]: { ...OPTION, version: 2 },
    });
    await screen.findByRole('heading', { name: 'Edit A' });
    const losses = screen.getByRole('group', { name: /^Volume loss/ });
    fireEvent.change(within(losses).getByLabelText('High'), { target: { value: '2,1' } });
    save();
    await waitFor(() => {
      expect(onSaved).toHaveBeenCalledTimes(1);
    });
    const sent = calls.find(({ route }) => route.startsWith('PATCH'));
    const volumeLoss = { low: 0.015, central: 0.015, high: 0.021 };
    expect(sent?.body).toEqual({
      version: 1,
      name: 'A',
      design: { ...OPTION.design, volumeLoss },
      shafts: [],
    });
  });

  it('is told a name that is taken at its field', async () => {
    const message = 'Another option has this name.';
    await openEditor([OPTION], {
      [`PATCH ${LIST}/${OPTION.id}`]: new Refusal(422, 'invalid-input', 'Mend it.', [
        { path: 'name', message },
      ]),
    });
    write('Name', 'B');
    save();
    await screen.findByText(message);
  });

  it('shows what somebody else changed, and keeps mine on top of it', async () => {
    const theirs = { ...OPTION, version: 2, changedBy: 'Bo', design: aDesign({ diameter: 7 }) };
    let seen = 0;
    const { calls, list, onSaved } = await openEditor([OPTION], {
      [`PATCH ${LIST}/${OPTION.id}`]: () => {
        seen += 1;
        return seen === 1 ? new Refusal(409, 'conflict', 'Changed meanwhile.') : theirs;
      },
    });
    list([theirs]);
    write('Ground level, m', '4');
    save();
    await screen.findByText(/^Bo changed A meanwhile/);
    fireEvent.click(screen.getByRole('button', { name: 'See their change' }));
    const row = within(screen.getByRole('table', { name: 'Their change' })).getByRole('row', {
      name: /Diameter/,
    });
    expect(row.textContent).toBe('Diameter6 m7 m');
    expect(await axeFaults()).toEqual([]);
    fireEvent.click(screen.getByRole('button', { name: 'Keep mine on top of it' }));
    save();
    await waitFor(() => {
      expect(onSaved).toHaveBeenCalledTimes(1);
    });
    const sent = calls.filter(({ route }) => route.startsWith('PATCH')).at(-1);
    expect(sent?.body).toEqual({
      version: 2,
      name: 'A',
      design: { ...theirs.design, groundLevel: 4 },
      shafts: [],
    });
  });

  it('asks before what was changed is given up', async () => {
    await openEditor([OPTION], {});
    press('Escape');
    await screen.findByText('1 options');
    press('a');
    write('Name', 'B');
    press('Escape');
    fireEvent.click(await screen.findByRole('button', { name: 'Give it up' }));
    await screen.findByText('1 options');
  });
});
