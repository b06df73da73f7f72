import { fireEvent, screen, waitFor } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { BuildingForm } from '../../../../src/features/buildings/components/building-form.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { aBuildingAnswer, anId, aRulesVersion, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const SCHEME = `/api/schemes/${anId(10)}`;
const SAVE = `PATCH ${SCHEME}/buildings/1`;
const CHANGE = { changeId: anId(90), version: 2, buildingIds: [1] };
const AROUND = {
  [`GET ${SCHEME}`]: aSchemeAnswer(),
  'GET /api/waiting': [],
};

function openForm(abilities: Record<string, boolean> = {}) {
  const onSaved = vi.fn();
  renderPage(
    <SchemeContext value={aSchemeAnswer({ abilities })}>
      <BuildingForm
        schemeId={anId(10)}
        building={aBuildingAnswer()}
        onSaved={onSaved}
        onCancel={() => undefined}
      />
    </SchemeContext>,
  );
  return onSaved;
}

function write(label: string, value: string): void {
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
}

function save(): void {
  fireEvent.click(screen.getByRole('button', { name: 'Save' }));
}

/** The words that a field offers. */
function offeredFor(label: string): string[] {
  const { list } = screen.getByLabelText<HTMLInputElement>(label);
  return [...(list?.options ?? [])].map(({ value }) => value);
}

const MOVED = 'Moved or repaired before';

describe('the reasons for scores in the form of a building', () => {
  const withRules = { ...AROUND, [`GET ${SCHEME}/rules`]: [aRulesVersion()] };

  it('are those of the scheme, and bring their score along', async () => {
    const { calls } = fakeApi({ ...withRules, [SAVE]: CHANGE });
    const onSaved = openForm({ readRules: true });
    await waitFor(() => {
      expect(offeredFor('Structure score because')).toContain(MOVED);
    });
    expect(offeredFor('Features score because')).not.toContain(MOVED);
    write('Structure score because', MOVED);
    expect(screen.getByLabelText<HTMLInputElement>('Structure score').value).toBe('1');
    expect(screen.getByLabelText<HTMLInputElement>('Features score').value).toBe('');
    expect(await axeFaults()).toEqual([]);
    save();
    await waitFor(() => {
      expect(onSaved).toHaveBeenCalled();
    });
    expect(calls.find(({ route }) => route === SAVE)?.body).toEqual({
      version: 1,
      attributes: { structureScore: 1, structureReason: MOVED },
    });
  });

  it('may be other words, with a score of 0 to 2 of one’s own', async () => {
    fakeApi(withRules);
    openForm({ readRules: true });
    await waitFor(() => {
      expect(offeredFor('Structure score because')).not.toEqual([]);
    });
    write('Features score', '3');
    write('Features score because', 'Organ loft');
    expect(screen.getByLabelText<HTMLInputElement>('Features score').value).toBe('3');
    save();
    expect(await screen.findByText('From 0 to 2.')).toBeTruthy();
  });

  it('are not asked for by who may not read the rules', () => {
    const { calls } = fakeApi(withRules);
    openForm();
    expect(offeredFor('Structure score because')).toEqual([]);
    expect(calls).toEqual([]);
  });
});

describe('the form of a building', () => {
  it('sends what was changed with the version that was seen', async () => {
    const { calls } = fakeApi({ ...AROUND, [SAVE]: CHANGE });
    const onSaved = openForm();
    write('Founding level, m', '\u22121,25');
    write('Use', '');
    save();
    await waitFor(() => {
      expect(onSaved).toHaveBeenCalledWith(CHANGE, expect.anything(), undefined, expect.anything());
    });
    expect(calls.find(({ route }) => route === SAVE)?.body).toEqual({
      version: 1,
      attributes: { use: null, foundingLevel: -1.25 },
    });
  });

  it('marks what is no number or out of its bounds', async () => {
    fakeApi(AROUND);
    openForm();
    write('Storeys', 'two');
    write('Poisson’s ratio', '7');
    save();
    expect(await screen.findByText('Write a number.')).toBeTruthy();
    expect(screen.getByText('From 0 to 0.5.')).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
  });

  it('changes nothing where nothing was written', async () => {
    const { calls } = fakeApi(AROUND);
    const onSaved = openForm();
    save();
    await waitFor(() => {
      expect(onSaved).toHaveBeenCalledWith(null);
    });
    expect(calls).toEqual([]);
  });

  it('puts theirs beside mine, and saves what is chosen on top of theirs', async () => {
    const bodies: unknown[] = [];
    fakeApi({
      ...AROUND,
      [`GET ${SCHEME}/buildings/1`]: aBuildingAnswer({ version: 4, storeys: 4, use: 'workshop' }),
      [SAVE]: (body: unknown) => {
        bodies.push(body);
        return bodies.length === 1 ? new Refusal(409, 'conflict', 'B0001 was changed.') : CHANGE;
      },
    });
    const onSaved = openForm();
    write('Storeys', '3');
    write('Condition', 'poor');
    save();
    const mine = await screen.findByLabelText('Mine 3');
    expect(screen.getByLabelText('Theirs 4')).toBeTruthy();
    expect(screen.getByText('Saved as well: condition.')).toBeTruthy();
    expect(screen.getByText('Stays as they left it: use.')).toBeTruthy();
    expect(await axeFaults()).toEqual([]);

    // nothing is lost by looking at the form again
    fireEvent.click(screen.getByRole('button', { name: 'Back to the form' }));
    expect(screen.getByLabelText<HTMLInputElement>('Storeys').value).toBe('3');
    expect(screen.getByLabelText<HTMLInputElement>('Use').value).toBe('workshop');
    save();
    await waitFor(() => {
      expect(onSaved).toHaveBeenCalled();
    });
    expect(mine).toBeTruthy();
    expect(bodies[1]).toEqual({ version: 4, attributes: { storeys: 3, condition: 'poor' } });
  });

  it('leaves theirs where that is chosen', async () => {
    let tries = 0;
    const { calls } = fakeApi({
      ...AROUND,
      [`GET ${SCHEME}/buildings/1`]: aBuildingAnswer({ version: 4, storeys: 4 }),
      [SAVE]: () => {
        tries += 1;
        return tries === 1 ? new Refusal(409, 'conflict', 'B0001 was changed.') : CHANGE;
      },
    });
    const onSaved = openForm();
    write('Storeys', '3');
    save();
    fireEvent.click(await screen.findByLabelText('Theirs 4'));
    fireEvent.click(screen.getByRole('button', { name: 'Save what is chosen' }));
    await waitFor(() => {
      expect(onSaved).toHaveBeenCalledWith(null);
    });
    expect(calls.filter(({ route }) => route === SAVE)).toHaveLength(1);
  });
});
