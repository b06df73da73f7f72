import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { Link } from 'react-router-dom';
import { describe, expect, it, vi } from 'vitest';
import { DrawingSide } from '../../../../src/features/drawing/components/drawing-side.tsx';
import { DrawingTools } from '../../../../src/features/drawing/components/drawing-tools.tsx';
import { usePlanDrawing } from '../../../../src/features/drawing/hooks/use-plan-drawing.ts';
import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import { aBuildingAnswer, anId, aRegisterRow } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const SCHEME = `/api/schemes/${anId(10)}`;
const LAST = `${SCHEME}/register?${new URLSearchParams({
  filter: '{}',
  sort: JSON.stringify({ column: 'reference', descending: true }),
  offset: '0',
  limit: '1',
}).toString()}`;
const CHANGE = { changeId: anId(70), version: 5, buildingIds: [9] };
const HOUSE = aBuildingAnswer({
  id: 7,
  reference: 'B0007',
  footprint: [[[[0.123456789, 0], [10, 0], [10, 8], [0, 8], [0.123456789, 0]]]],
}); // prettier-ignore

type DeskProps = {
  readonly building?: BuildingAnswer;
  readonly isWriting?: boolean;
  readonly select: (id: number | null) => void;
};

/** The side of the plan without its map. */
function Desk({ building, isWriting = false, select }: DeskProps) {
  const around = { schemeId: anId(10), canDraw: true, isWriting, building, select };
  const drawing = usePlanDrawing(around);
  return (
    <main>
      <h1>Plan</h1>
      <DrawingTools drawing={drawing} select={select} />
      <DrawingSide drawing={drawing}>Nothing is drawn.</DrawingSide>
      <Link to="/register">Register</Link>
    </main>
  );
}

function openDesk(building?: BuildingAnswer, isWriting = false) {
  const select = vi.fn();
  renderPage(<Desk {...(building !== undefined && { building })} {...{ isWriting, select }} />);
  return select;
}

function press(key: string, more: KeyboardEventInit = {}): void {
  fireEvent.keyDown(document.body, { key, ...more });
}

function addCorner(east: string, north: string): void {
  fireEvent.change(screen.getByLabelText('Easting'), { target: { value: east } });
  fireEvent.change(screen.getByLabelText('Northing'), { target: { value: north } });
  fireEvent.click(screen.getByRole('button', { name: /^Add (corner|point)$/ }));
}

function rewrite(label: string, value: string): void {
  const input = screen.getByLabelText(label);
  fireEvent.change(input, { target: { value } });
  fireEvent.keyDown(input, { key: 'Enter' });
}

describe('the tools', () => {
  it('say why they cannot be used', async () => {
    openDesk();
    const tools = screen.getByRole('group', { name: 'Draw buildings' });
    expect(within(tools).getByRole('button', { name: 'Select' }).ariaPressed).toBe('true');
    const edit = within(tools).getByRole('button', { name: 'Edit the outline' });
    expect(edit.ariaDisabled).toBe('true');
    expect(edit.title === '' && edit.getAttribute('aria-describedby')).toBeTruthy();
    fireEvent.click(edit);
    expect(screen.getAllByRole('status').map(({ textContent }) => textContent)).toContain(
      'Select a building first.',
    );
    expect(await axeFaults()).toEqual([]);
  });

  it('rest while values of a building are being written', () => {
    openDesk(HOUSE, true);
    press('e');
    expect(screen.getByText('Nothing is drawn.')).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Split' }));
    expect(screen.getAllByRole('status').map(({ textContent }) => textContent)).toContain(
      'Save the values, or leave them, first.',
    );
  });

  it('have keys', () => {
    openDesk(HOUSE);
    for (const [key, title] of [
      ['d', 'Draw a building'],
      ['e', 'Outline of B0007'],
      ['c', 'Split B0007'],
      ['u', 'Join buildings'],
    ] as const) {
      press(key);
      expect(screen.getByRole('heading', { name: title })).toBeTruthy();
    }
    press('v');
    expect(screen.queryByRole('heading', { name: 'Join buildings' })).toBeNull();
  });
});

describe('drawing by figures', () => {
  it('closes, proposes a reference, saves, and can be undone', async () => {
    const { calls } = fakeApi({
      [`GET ${LAST}`]: {
        rows: [aRegisterRow({ reference: 'B0197' })],
        found: 9,
        all: 9,
        version: 4,
        run: null,
      },
      [`POST ${SCHEME}/buildings`]: CHANGE,
      [`POST ${SCHEME}/register-changes/${anId(70)}/undo`]: { ...CHANGE, changeId: anId(71) },
      [`POST ${SCHEME}/register-changes/${anId(71)}/undo`]: CHANGE,
    });
    const select = openDesk();
    press('d');
    addCorner('412500', '6068300');
    addCorner('412510,5', '6068300');
    addCorner('nonsense', '1');
    expect(screen.getByRole('alert').textContent).toBe('Write both in metres of the grid.');
    addCorner('412510.5', '6068308');
    addCorner('1', '1');
    press('Backspace');
    press('Enter');
    await waitFor(() => {
      expect(screen.getByLabelText<HTMLInputElement>('Reference').value).toBe('B0198');
    });
    expect(await axeFaults()).toEqual([]);
    fireEvent.click(screen.getByRole('button', { name: 'Save the building' }));
    await screen.findByText('B0198 is in the register.');
    expect(calls.find(({ route }) => route.startsWith('POST'))?.body).toEqual({
      reference: 'B0198',
      footprint: [[[[412500, 6068300], [412510.5, 6068300], [412510.5, 6068308], [412500, 6068300]]]],
    }); // prettier-ignore
    expect(select).toHaveBeenLastCalledWith(9);
    press('z', { ctrlKey: true });
    await screen.findByText('Undone: B0198 is in the register.');
    press('z', { ctrlKey: true, shiftKey: true });
    await screen.findByText('Done again: B0198 is in the register.');
    expect(select).toHaveBeenLastCalledWith(9);
    fireEvent.click(screen.getByRole('button', { name: /^Undo Ctrl Z/ }));
    await screen.findByText('Undone: B0198 is in the register.');
    const undone = calls.filter(({ route }) => route.endsWith('/undo'));
    expect(undone.map(({ route }) => route.split('/').at(-2))).toEqual([
      ...[anId(70), anId(71), anId(70)],
    ]);
  });

  it('keeps the reference that was written while a courtyard is added', async () => {
    fakeApi({ [`GET ${LAST}`]: { rows: [], found: 0, all: 0, version: 1, run: null } });
    openDesk();
    press('d');
    for (const [east, north] of [['0', '0'], ['9', '0'], ['9', '9']] as const) addCorner(east, north); // prettier-ignore
    press('Enter');
    fireEvent.change(await screen.findByLabelText('Reference'), { target: { value: 'Mill' } });
    fireEvent.click(screen.getByRole('button', { name: 'Add a courtyard H' }));
    fireEvent.click(screen.getByRole('button', { name: 'Leave it out Esc' }));
    expect(screen.getByLabelText<HTMLInputElement>('Reference').value).toBe('Mill');
  });

  it('asks before the page is left with something drawn', async () => {
    openDesk();
    press('d');
    addCorner('1', '0');
    fireEvent.click(screen.getByRole('link', { name: 'Register' }));
    const question = await screen.findByRole('dialog', { name: 'Leave without saving?' });
    expect(question.textContent).toContain('What you drew is not saved yet.');
    fireEvent.click(within(question).getByRole('button', { name: 'Stay here' }));
    expect(screen.getByLabelText('Corner 1, easting')).toBeTruthy();
  });

  it('asks before more than three corners are lost', () => {
    openDesk();
    press('d');
    for (const east of ['1', '2', '3', '4']) addCorner(east, east === '3' ? '9' : '0');
    press('Escape');
    const question = screen.getByRole('dialog', { name: 'Give up what is drawn?' });
    expect(question.textContent).toContain('four corners would be lost');
    fireEvent.click(within(question).getByRole('button', { name: 'Give it up' }));
    expect(screen.queryByRole('heading', { name: 'Draw a building' })).toBeNull();
  });
});

describe('an outline', () => {
  const ROUTE = `${SCHEME}/buildings/7`;

  it('sends corners that were not moved to the last digit', async () => {
    const { calls } = fakeApi({ [`PATCH ${ROUTE}`]: CHANGE });
    openDesk(HOUSE);
    press('e');
    rewrite('Corner 3, northing', '9');
    rewrite('Corner 2, easting', '11');
    press('z', { ctrlKey: true });
    expect(screen.getByText('+5.0 m²')).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Save the outline' }));
    await screen.findByText('The outline of B0007 is changed.');
    expect(calls[0]?.body).toEqual({
      version: 1,
      footprint: [[[[0.123456789, 0], [10, 0], [10, 9], [0, 8], [0.123456789, 0]]]],
    }); // prettier-ignore
  });

  it('gets a courtyard and a part by keys, and loses one again', async () => {
    const { calls } = fakeApi({ [`PATCH ${ROUTE}`]: CHANGE });
    openDesk(HOUSE);
    press('e');
    press('h');
    expect(screen.getByRole('heading', { name: 'Add a courtyard' })).toBeTruthy();
    addCorner('2', '2');
    addCorner('4', '2');
    addCorner('4', '9');
    expect(screen.getByText(/A courtyard lies inside the building/)).toBeTruthy();
    press('Enter');
    rewrite('Courtyard 1, Corner 3, northing', '4');
    expect(screen.getByText('2.0 m²')).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
    press('Enter');
    expect(screen.getByText('\u22122.0 m²')).toBeTruthy();
    press('n');
    for (const [east, north] of [['20', '0'], ['25', '0'], ['25', '4']] as const) addCorner(east, north); // prettier-ignore
    press('Enter');
    expect(screen.getByText('+8.0 m²')).toBeTruthy();
    press('h');
    addCorner('6', '6');
    press('Escape');
    expect(screen.getByRole('heading', { name: 'Outline of B0007' })).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
    fireEvent.click(screen.getByRole('button', { name: 'Remove part 2' }));
    press('z', { ctrlKey: true });
    fireEvent.click(screen.getByRole('button', { name: 'Remove part 1, courtyard 1' }));
    press('z', { ctrlKey: true });
    fireEvent.click(screen.getByRole('button', { name: 'Save the outline' }));
    await screen.findByText('The outline of B0007 is changed.');
    expect(calls[0]?.body).toMatchObject({
      footprint: [
        [
          [[0.123456789, 0], [10, 0], [10, 8], [0, 8], [0.123456789, 0]],
          [[2, 2], [4, 2], [4, 4], [2, 2]],
        ],
        [[[20, 0], [25, 0], [25, 4], [20, 0]]],
      ],
    }); // prettier-ignore
  });

  it('is saved over that of somebody else only when it is chosen', async () => {
    let tries = 0;
    const { calls } = fakeApi({
      [`PATCH ${ROUTE}`]: () => {
        tries += 1;
        return tries > 1 ? CHANGE : new Refusal(409, 'conflict', 'Somebody else changed B0007.');
      },
      [`GET ${ROUTE}`]: { ...HOUSE, version: 2 },
    });
    openDesk(HOUSE);
    press('e');
    rewrite('Corner 3, northing', '9');
    fireEvent.click(screen.getByRole('button', { name: 'Save the outline' }));
    await screen.findByText('Somebody else changed this building meanwhile.');
    fireEvent.click(screen.getByRole('button', { name: 'Save my outline' }));
    await screen.findByText('The outline of B0007 is changed.');
    expect(calls.at(-1)?.body).toMatchObject({ version: 2 });
  });
});
