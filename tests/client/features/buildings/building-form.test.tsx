import { fireEvent, screen, waitFor } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { BuildingForm } from '../../../../src/features/buildings/components/building-form.tsx';
import { aBuildingAnswer, anId, aSchemeAnswer } from '../../../support/answers.ts';
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

function openForm() {
  const onSaved = vi.fn();
  renderPage(
    <BuildingForm
      schemeId={anId(10)}
      building={aBuildingAnswer()}
      onSaved={onSaved}
      onCancel={() => undefined}
    />,
  );
  return onSaved;
}

function write(label: string, value: string): void {
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
}

function save(): void {
  fireEvent.click(screen.getByRole('button', { name: 'Save' }));
}

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
