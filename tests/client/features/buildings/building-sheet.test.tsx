import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { describe, expect, it, vi } from 'vitest';
import type { BuildingAnswer, BuildingWall } from '../../../../shared/schemas/buildings.ts';
import {
  BuildingSheet,
  type SheetView,
} from '../../../../src/features/buildings/components/building-sheet.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { aBuildingAnswer, anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const SCHEME = `/api/schemes/${anId(10)}`;
const CHANGE = { changeId: anId(90), version: 2, buildingIds: [1] };

function aWall(letter: string, overrides: Partial<BuildingWall> = {}): BuildingWall {
  return {
    letter,
    start: [0, 0],
    end: [9, 0],
    length: 9,
    bearing: 90,
    sharedWith: [],
    ...overrides,
  };
}

const onChanged = vi.fn();

function Sheet({ building, mayEdit }: { building: BuildingAnswer; mayEdit: boolean }) {
  const [view, onView] = useState<SheetView>('facts');
  return (
    <main>
      <h1>Plan</h1>
      <SchemeContext value={aSchemeAnswer()}>
        <BuildingSheet schemeId={anId(10)} {...{ building, mayEdit, view, onView, onChanged }} />
      </SchemeContext>
      <Link to="/elsewhere">Elsewhere</Link>
    </main>
  );
}

function openSheet(overrides: Partial<BuildingAnswer> = {}, mayEdit = true): void {
  renderPage(<Sheet building={aBuildingAnswer(overrides)} mayEdit={mayEdit} />);
}

describe('the sheet of a building', () => {
  it('marks what is assumed, and lists the walls with their neighbours', async () => {
    openSheet({
      storeys: null,
      assumed: ['storeys'],
      walls: [
        aWall('A', { length: 12.34 }),
        aWall('B', { sharedWith: [{ id: 2, reference: 'B0002' }, { id: 3, reference: 'B0003' }] }),
      ],
    }); // prettier-ignore
    expect(screen.getByText('One value is assumed by the method, over dotted lines.')).toBeTruthy();
    const walls = within(screen.getByRole('table', { name: 'Walls' }));
    expect(walls.getByRole('row', { name: 'A 12.3 free' })).toBeTruthy();
    expect(walls.getByRole('row', { name: 'B 9.0 B0002, B0003' })).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
  });

  it('is changed by hand, and not lost by leaving', async () => {
    fakeApi({
      [`GET ${SCHEME}`]: aSchemeAnswer(),
      'GET /api/waiting': [],
      [`PATCH ${SCHEME}/buildings/1`]: CHANGE,
    });
    openSheet();
    fireEvent.click(screen.getByRole('button', { name: 'Edit' }));
    fireEvent.change(screen.getByLabelText('Use'), { target: { value: 'shop' } });
    fireEvent.click(screen.getByRole('link', { name: 'Elsewhere' }));
    const question = await screen.findByRole('dialog', { name: 'Leave without saving?' });
    fireEvent.click(within(question).getByRole('button', { name: 'Stay here' }));
    fireEvent.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() => {
      expect(onChanged).toHaveBeenCalledWith(CHANGE);
    });
    expect(screen.getByRole('button', { name: 'Edit' })).toBeTruthy();
  });

  it('shows its history to who only reads', async () => {
    fakeApi({ [`GET ${SCHEME}/buildings/1/history`]: [] });
    openSheet({}, false);
    expect(screen.queryByRole('button', { name: 'Edit' })).toBeNull();
    fireEvent.click(screen.getByRole('button', { name: 'History' }));
    expect(await screen.findByText('Nothing changed yet.')).toBeTruthy();
  });
});
