import { fireEvent, screen, waitFor } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { DescriptionPage } from '../../../../src/app/routes/settings-description.tsx';
import { DescriptionForm } from '../../../../src/features/schemes/components/description-form.tsx';
import { NewSchemeForm } from '../../../../src/features/schemes/components/new-scheme-form.tsx';
import { SchemeList } from '../../../../src/features/schemes/components/scheme-list.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { aCrsAnswer, anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

const CRS = aCrsAnswer();
const FOUND = [{ code: CRS.code, name: CRS.name, area: CRS.area }];
const MANAGES = { readScheme: true, updateScheme: true, archiveScheme: true };

/** The form of a scheme that a newer one comes for while something is written. */
function LateDescription({ theirs }: { readonly theirs: SchemeAnswer }) {
  const [scheme, setScheme] = useState(aSchemeAnswer({ abilities: MANAGES }));
  return (
    <>
      <DescriptionForm scheme={scheme} />
      <button
        type="button"
        onClick={() => {
          setScheme(theirs);
        }}
      >
        Theirs comes
      </button>
    </>
  );
}

describe('NewSchemeForm', () => {
  it('finds a system by what is typed, explains it and makes the scheme on it', async () => {
    const onMade = vi.fn();
    const { calls } = fakeApi({
      'GET /api/crs?search=utm+31': FOUND,
      'GET /api/crs/32631': CRS,
      'POST /api/schemes': aSchemeAnswer(),
    });
    renderPage(<NewSchemeForm onMade={onMade} />);
    fireEvent.change(screen.getByLabelText('Name'), { target: { value: 'Port Dogger crossing' } });
    const search = screen.getByLabelText('Coordinate system');
    fireEvent.change(search, { target: { value: 'utm 31' } });
    await screen.findByRole('option');
    fireEvent.keyDown(search, { key: 'Enter' });
    expect(await screen.findByText('0.0° E to 6.0° E, 0.0° N to 84.0° N')).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
    fireEvent.click(screen.getByRole('button', { name: 'Make the scheme' }));
    await waitFor(() => {
      expect(onMade).toHaveBeenCalledOnce();
    });
    expect(calls.at(-1)?.body).toEqual({
      name: 'Port Dogger crossing',
      description: '',
      crs: 32631,
    });
  });

  it('asks for a name and a system', async () => {
    renderPage(<NewSchemeForm onMade={() => undefined} />);
    fireEvent.click(screen.getByRole('button', { name: 'Make the scheme' }));
    expect(await screen.findByText('Give it a name.')).toBeTruthy();
    expect(screen.getByText('Choose one.')).toBeTruthy();
  });

  it('says that nothing is found', async () => {
    fakeApi({ 'GET /api/crs?search=zzz': [] });
    renderPage(<NewSchemeForm onMade={() => undefined} />);
    const search = screen.getByLabelText('Coordinate system');
    fireEvent.change(search, { target: { value: 'zzz' } });
    expect(await screen.findByText(/No projected system in metres/)).toBeTruthy();
  });
});

describe('SchemeList', () => {
  it('shows archived schemes only when asked', () => {
    const archived = aSchemeAnswer({
      id: anId(11),
      name: 'Fish market siding',
      archivedAt: '2026-05-01T09:00:00.000Z',
    });
    renderPage(<SchemeList schemes={[aSchemeAnswer(), archived]} />);
    expect(screen.queryByText('Fish market siding')).toBeNull();
    fireEvent.click(screen.getByRole('button', { name: 'Show 1 archived' }));
    expect(screen.getByText('Fish market siding')).toBeTruthy();
    expect(screen.getByText('Archived 1 May 2026')).toBeTruthy();
  });
});

describe('the description of a scheme', () => {
  function openDescription(scheme = aSchemeAnswer({ abilities: MANAGES })) {
    renderPage(
      <SchemeContext value={scheme}>
        <DescriptionPage />
      </SchemeContext>,
    );
  }
  const path = `/api/schemes/${anId(10)}`;

  it('is changed with the version it was read at', async () => {
    const changed = aSchemeAnswer({ version: 2, name: 'Dogger', abilities: MANAGES });
    const { calls } = fakeApi({ 'GET /api/crs/32631': CRS, [`PATCH ${path}`]: changed });
    openDescription();
    fireEvent.change(screen.getByLabelText('Name'), { target: { value: 'Dogger' } });
    fireEvent.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() => {
      expect(calls.find(({ route }) => route.startsWith('PATCH'))?.body).toEqual({
        version: 1,
        name: 'Dogger',
        description: '',
      });
    });
  });

  it('lays what was written on the change of who was faster', async () => {
    const theirs = aSchemeAnswer({ version: 2, description: 'Theirs.', abilities: MANAGES });
    const { calls } = fakeApi({
      'GET /api/crs/32631': CRS,
      [`PATCH ${path}`]: (body: unknown) =>
        JSON.stringify(body).includes('"version":1')
          ? new Refusal(409, 'conflict', 'Somebody else changed this meanwhile.')
          : theirs,
    });
    renderPage(<LateDescription theirs={theirs} />);
    fireEvent.change(screen.getByLabelText('Name'), { target: { value: 'Dogger' } });
    fireEvent.click(screen.getByRole('button', { name: 'Save' }));
    await screen.findByRole('alert');
    expect(screen.queryByRole('button', { name: 'See their change' })).toBeNull();
    fireEvent.click(screen.getByRole('button', { name: 'Theirs comes' }));
    fireEvent.click(screen.getByRole('button', { name: 'See their change' }));
    expect(screen.getByRole('table', { name: 'Their change' }).textContent).toContain('Theirs.');
    fireEvent.click(screen.getByRole('button', { name: 'Keep mine on top of it' }));
    fireEvent.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() => {
      expect(calls.findLast(({ route }) => route.startsWith('PATCH'))?.body).toEqual({
        version: 2,
        name: 'Dogger',
        description: 'Theirs.',
      });
    });
  });

  it('keeps what was typed when somebody else was faster', async () => {
    const conflict = new Refusal(409, 'conflict', 'Somebody else changed this meanwhile.');
    fakeApi({ 'GET /api/crs/32631': CRS, [`PATCH ${path}`]: conflict });
    openDescription();
    fireEvent.change(screen.getByLabelText('Name'), { target: { value: 'Dogger' } });
    fireEvent.click(screen.getByRole('button', { name: 'Save' }));
    expect((await screen.findByRole('alert')).textContent).toContain('Somebody else');
    expect(screen.getByLabelText<HTMLInputElement>('Name').value).toBe('Dogger');
  });

  it('is archived once that is confirmed', async () => {
    const archived = aSchemeAnswer({ archivedAt: '2026-05-01T09:00:00.000Z' });
    const { calls } = fakeApi({ 'GET /api/crs/32631': CRS, [`PUT ${path}/archived`]: archived });
    openDescription();
    fireEvent.click(screen.getByRole('button', { name: 'Archive the scheme' }));
    fireEvent.click(screen.getByRole('button', { name: 'Archive it' }));
    await waitFor(() => {
      const call = calls.find(({ route }) => route.endsWith('/archived'));
      expect(call?.body).toEqual({ archived: true, version: 1 });
    });
  });

  it('is only read by who may not change it', async () => {
    fakeApi({ 'GET /api/crs/32631': CRS });
    openDescription(aSchemeAnswer({ description: 'Twin-bore metro.' }));
    expect(await screen.findByText('North Sea.')).toBeTruthy();
    expect(screen.getByText('Twin-bore metro.')).toBeTruthy();
    expect(screen.queryByRole('button')).toBeNull();
  });
});
