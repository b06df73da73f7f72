import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { Route, Routes } from 'react-router-dom';
import { describe, expect, it, vi } from 'vitest';
import type { ImportAnswer, ImportRow } from '../../../../shared/schemas/imports.ts';
import { ImportPage } from '../../../../src/app/routes/import.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import {
  anImportAnswer,
  anImportRow,
  importCounts,
  importOptions,
} from '../../../support/import-answers.ts';
import { renderPage } from '../../../support/render-page.tsx';

vi.mock('../../../../src/features/imports/components/import-map.tsx', () => ({
  ImportMap: ({ onRow }: { onRow: (row: number) => void }) => (
    <button
      type="button"
      onClick={() => {
        onRow(2);
      }}
    >
      Row 2 on the map
    </button>
  ),
}));

const UNDOING = { changeId: anId(61), version: 4, buildingIds: [] };
const SCHEME = `/api/schemes/${anId(10)}`;
const IMPORT = `${SCHEME}/imports/${anId(50)}`;
const SESSION = {
  'GET /api/session': { csrfToken: 'token', demo: true, person: null },
};

function rowsRoute(outcome?: string): string {
  return `GET ${IMPORT}/rows?offset=0&limit=100${outcome === undefined ? '' : `&outcome=${outcome}`}`;
}

function answersFor(answer: ImportAnswer, rows: readonly ImportRow[] = [anImportRow()]) {
  return {
    ...SESSION,
    [`GET ${IMPORT}`]: answer,
    [`GET ${SCHEME}/imports`]: [],
    [rowsRoute()]: { rows, found: rows.length },
  };
}

function openImport() {
  const scheme = aSchemeAnswer({ abilities: { updateRegister: true, readRegister: true } });
  renderPage(
    <SchemeContext value={scheme}>
      <Routes>
        <Route path="/i/:importId" element={<ImportPage />} />
        <Route path="*" element={null} />
      </Routes>
    </SchemeContext>,
    `/i/${anId(50)}`,
  );
}

describe('the preview of an import', () => {
  it('says where it lies, which column is what, and what will happen', async () => {
    fakeApi(
      answersFor(
        anImportAnswer({ remembered: { at: '2025-11-30T09:00:00.000Z', fileName: 'old.gpkg' } }),
      ),
    );
    openImport();
    expect(await screen.findByText('EPSG:4326 WGS 84')).toBeTruthy();
    expect(screen.getByText('Files of this kind always are; up to 1 m off.')).toBeTruthy();
    expect(screen.getByText(/^As chosen on 30 November 2025 for old.gpkg/)).toBeTruthy();
    expect(screen.getByLabelText<HTMLSelectElement>('Use').value).toBe('currentUse');
    expect(screen.getByText('2 229 of 2 253 filled', { exact: false })).toBeTruthy();
    expect(screen.getByText('Not used: localId.')).toBeTruthy();
    expect(screen.getByText('368 818 m²')).toBeTruthy();
    expect(await screen.findByText('A1')).toBeTruthy();
    expect(screen.getByText('Preview: nothing is written yet')).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
  });

  it('brings the buildings in as they were checked', async () => {
    const done = anImportAnswer({ state: 'done', changeId: anId(60) });
    const { calls } = fakeApi({
      ...answersFor(anImportAnswer()),
      [`POST ${IMPORT}/confirm`]: done,
      [`GET ${SCHEME}`]: aSchemeAnswer(),
      [`POST ${SCHEME}/register-changes/${anId(60)}/undo`]: UNDOING,
      [`POST ${SCHEME}/register-changes/${UNDOING.changeId}/undo`]: UNDOING,
    });
    openImport();
    fireEvent.click(await screen.findByRole('button', { name: /^Bring in 2\s253 buildings$/ }));
    expect(await screen.findByText('Brought in: 2 253 new.')).toBeTruthy();
    expect(calls.find(({ route }) => route.endsWith('/confirm'))?.body).toEqual({ version: 3 });
    expect(screen.getByRole('link', { name: 'Open the register' })).toBeTruthy();
    expect(screen.getByText('What happened')).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'Cancel import' })).toBeNull();

    fireEvent.click(screen.getByRole('button', { name: 'Undo' }));
    fireEvent.click(screen.getByRole('button', { name: 'Undo it' }));
    expect(await screen.findByText(/^Undone\./)).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Put it back' }));
    expect(await screen.findByRole('button', { name: 'Undo' })).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
  });

  it('does not bring in what is not ready, and says why', async () => {
    const { calls } = fakeApi(
      answersFor(
        anImportAnswer({
          options: importOptions({ place: { crs: null, exchangeAxes: false, shift: [0, 0] } }),
          place: {
            ...anImportAnswer().place,
            crs: null,
            name: null,
            from: 'nobody',
            candidates: [{ code: 25830, name: 'UTM 30N' }],
            accuracy: null,
            words: 'The zip has no .prj.',
          },
          missing: ['crs'],
          counts: null,
          bounds: null,
        }),
      ),
    );
    openImport();
    const button = await screen.findByRole('button', { name: 'Bring in buildings' });
    expect(button.getAttribute('aria-disabled')).toBe('true');
    const reason = button.getAttribute('aria-describedby') ?? '';
    expect(document.getElementById(reason)?.textContent).toBe(
      'Say which system the coordinates are in.',
    );
    fireEvent.click(button);
    expect(calls.some(({ route }) => route.startsWith('POST'))).toBe(false);
    expect(
      screen.getByRole('combobox', { name: 'Which system are its coordinates in?' }),
    ).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
  });

  it('takes a candidate at once', async () => {
    const place = { ...anImportAnswer().place, candidates: [{ code: 25830, name: 'UTM 30N' }] };
    const { calls } = fakeApi({
      ...answersFor(
        anImportAnswer({
          place: {
            ...anImportAnswer().place,
            ...place,
            crs: 4326,
            name: 'WGS 84',
            from: 'the file',
            accuracy: 1,
            words: '.',
          },
        }),
      ),
      [`PATCH ${IMPORT}`]: anImportAnswer({ version: 4 }),
      [`GET ${IMPORT}/rows?offset=0&limit=100`]: { rows: [], found: 0 },
    });
    openImport();
    fireEvent.click(await screen.findByRole('button', { name: '25830 UTM 30N' }));
    await waitFor(() => {
      expect(calls.find(({ route }) => route.startsWith('PATCH'))?.body).toMatchObject({
        version: 3,
        options: { place: { crs: 25830 } },
      });
    });
  });

  it('collects what is chosen until it is checked again', async () => {
    const { calls } = fakeApi({
      ...answersFor(anImportAnswer()),
      [`PATCH ${IMPORT}`]: (body: unknown) => {
        expect(body).toMatchObject({
          version: 3,
          options: { place: { shift: [1.5, 0] }, columns: { reference: 'ref', name: 'localId' } },
        });
        return anImportAnswer({ version: 4 });
      },
    });
    openImport();
    fireEvent.change(await screen.findByLabelText('Name'), { target: { value: 'localId' } });
    const east = screen.getByLabelText('East, m');
    fireEvent.change(east, { target: { value: 'x' } });
    expect(screen.getByText('Write metres, from −2000 to 2000.')).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Check again' }));
    expect(calls.some(({ route }) => route.startsWith('PATCH'))).toBe(false);
    fireEvent.change(east, { target: { value: '1,5' } });
    fireEvent.click(screen.getByRole('button', { name: 'Check again' }));
    expect(await screen.findByRole('button', { name: /^Bring in/ })).toBeTruthy();
  });

  it('takes back what was chosen', async () => {
    fakeApi(answersFor(anImportAnswer()));
    openImport();
    const use = await screen.findByLabelText<HTMLSelectElement>('Use');
    fireEvent.change(use, { target: { value: '' } });
    fireEvent.click(screen.getByRole('button', { name: 'Take it back' }));
    expect(use.value).toBe('currentUse');
    expect(screen.getByRole('button', { name: /^Bring in/ })).toBeTruthy();
  });

  it('says when somebody else was faster, and shows what they did', async () => {
    const { calls } = fakeApi({
      ...answersFor(anImportAnswer()),
      [`POST ${IMPORT}/confirm`]: new Refusal(409, 'conflict', 'The import was changed since.'),
    });
    openImport();
    fireEvent.click(await screen.findByRole('button', { name: /^Bring in/ }));
    expect((await screen.findByRole('alert')).textContent).toContain(
      'The import was changed since.',
    );
    await waitFor(() => {
      expect(calls.filter(({ route }) => route === `GET ${IMPORT}`)).toHaveLength(2);
    });
  });
});

describe('the report', () => {
  const conflict = anImportRow({
    row: 2,
    reference: 'A2',
    outcome: 'conflict',
    changes: [
      { field: 'storeys', ours: 3, theirs: 4, isConflict: true, isKept: false },
      { field: 'condition', ours: 'good', theirs: 'fair', isConflict: false, isKept: true },
    ],
  });
  const crossing = anImportRow({
    row: 3,
    reference: 'A3',
    remarks: ['Its outline crosses itself. It was mended.'],
    isMended: true,
  });
  const answer = anImportAnswer({
    missing: ['settle'],
    counts: importCounts({ conflict: 1, noted: 1, mendable: 1, absent: 12 }),
  });
  const rows = [anImportRow(), conflict, crossing];

  it('is narrowed by its figures', async () => {
    fakeApi({
      ...answersFor(answer, rows),
      [rowsRoute('conflict')]: { rows: [conflict], found: 1 },
    });
    openImport();
    await screen.findByText('A1');
    fireEvent.click(screen.getByRole('button', { name: '1 to settle' }));
    await waitFor(() => {
      expect(screen.queryByText('A1')).toBeNull();
    });
    expect(screen.getByText('Report: to settle')).toBeTruthy();
    expect(screen.getByText(/12 buildings are not in the file/)).toBeTruthy();
  });

  it('opens a row from the map and settles it', async () => {
    const { calls } = fakeApi({
      ...answersFor(answer, rows),
      [`PATCH ${IMPORT}`]: anImportAnswer({ version: 4, missing: [] }),
    });
    openImport();
    await screen.findByText('A2');
    fireEvent.click(screen.getByRole('button', { name: 'Row 2 on the map' }));
    const values = await screen.findByRole('table', { name: 'Values of A2' });
    expect(within(values).getByText('both changed')).toBeTruthy();
    expect(within(values).getByText('changed here by hand; kept')).toBeTruthy();
    const ways = screen.getByRole('group', { name: 'Where both changed, for A2' });
    fireEvent.click(within(ways).getByRole('button', { name: 'Take theirs' }));
    fireEvent.click(screen.getByRole('button', { name: 'Check again' }));
    await waitFor(() => {
      expect(calls.find(({ route }) => route.startsWith('PATCH'))?.body).toMatchObject({
        options: { settle: { others: 'ask', rows: { A2: 'take theirs' } } },
      });
    });
  });

  it('shows an outline before and after it is mended', async () => {
    const square = [[[[0, 0], [1, 0], [1, 1], [0, 0]]]]; // prettier-ignore
    fakeApi({
      ...answersFor(answer, rows),
      [`GET ${IMPORT}/rows/3/mend`]: { before: square, after: square },
    });
    openImport();
    fireEvent.click(await screen.findByText('A3'));
    expect(await screen.findByRole('img', { name: 'Mended' })).toBeTruthy();
    expect(screen.getByRole('img', { name: 'In the file' })).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
  });
});

describe('while the server works', () => {
  it('is asked again until it is done', async () => {
    let asked = 0;
    fakeApi({
      ...answersFor(anImportAnswer()),
      [`GET ${IMPORT}`]: () => {
        asked += 1;
        return asked < 3
          ? anImportAnswer({
              state: 'reading',
              columns: [],
              place: null,
              counts: null,
              bounds: null,
              progress: { done: 31_200, of: 100_000 },
            })
          : anImportAnswer();
      },
    });
    openImport();
    expect(await screen.findByText('31 200 of 100 000 rows, 31 %')).toBeTruthy();
    expect(await screen.findByText('EPSG:4326 WGS 84', {}, { timeout: 5000 })).toBeTruthy();
  });

  it('goes on showing what was there before while it checks again', async () => {
    let asked = 0;
    fakeApi({
      ...answersFor(anImportAnswer()),
      [`GET ${IMPORT}`]: () => {
        asked += 1;
        if (asked === 1) return anImportAnswer();
        return anImportAnswer({
          version: 4,
          state: asked < 3 ? 'checking' : 'asking',
          // half of the rows are judged anew
          counts: importCounts({ new: asked < 3 ? 7 : 2000 }),
        });
      },
      [`PATCH ${IMPORT}`]: anImportAnswer({ version: 4, state: 'checking' }),
    });
    openImport();
    fireEvent.click(await screen.findByLabelText('Exchange the two axes'));
    expect(await screen.findByText('Being checked again; these figures are older.')).toBeTruthy();
    expect(screen.getByRole('button', { name: /^2\s253 new$/ })).toBeTruthy();
    expect(
      await screen.findByRole('button', { name: /^2\s000 new$/ }, { timeout: 5000 }),
    ).toBeTruthy();
  });

  it('can be cancelled, and says what stands', async () => {
    let state: ImportAnswer['state'] = 'importing';
    fakeApi({
      ...answersFor(anImportAnswer()),
      [`GET ${IMPORT}`]: () => anImportAnswer({ state, progress: { done: 0, of: 2253 } }),
      [`DELETE ${IMPORT}`]: () => {
        state = 'cancelled';
        return undefined;
      },
    });
    openImport();
    fireEvent.click(await screen.findByRole('button', { name: 'Cancel import' }));
    const dialog = await screen.findByRole('dialog');
    fireEvent.click(within(dialog).getByRole('button', { name: 'Cancel import' }));
    expect(await screen.findByText('Cancelled. The register is as it was.')).toBeTruthy();
  });

  it('says why it failed', async () => {
    fakeApi(
      answersFor(
        anImportAnswer({
          state: 'failed',
          columns: [],
          counts: null,
          place: null,
          bounds: null,
          kind: null,
          fault: 'It ends in the middle of row 12. Save it again.',
        }),
      ),
    );
    openImport();
    expect((await screen.findByRole('alert')).textContent).toContain(
      'row 12. Save it again. The register is as it was.',
    );
    expect(screen.getByRole('link', { name: 'Bring in a file' })).toBeTruthy();
  });

  it('says that an import is not there', async () => {
    fakeApi({ ...SESSION, [`GET ${IMPORT}`]: new Refusal(404, 'not-found', 'Nothing is here.') });
    openImport();
    expect(await screen.findByText('This import is not there any more.')).toBeTruthy();
  });
});
