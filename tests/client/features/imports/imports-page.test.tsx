import { fireEvent, screen, waitFor } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { ImportsPage } from '../../../../src/app/routes/imports.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { ApiError } from '../../../../src/lib/api-error.ts';
import { apiUpload } from '../../../../src/lib/api-upload.ts';
import { aCrsAnswer, anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { anImportAnswer, importCounts } from '../../../support/import-answers.ts';
import { renderPage } from '../../../support/render-page.tsx';

vi.mock('../../../../src/lib/api-upload.ts', () => ({ apiUpload: vi.fn() }));

const { id, state, fileName, by, at } = anImportAnswer();
const LISTED = { id, state, fileName, by, at, counts: importCounts({ refused: 4 }) };
const ANSWERS = {
  [`GET /api/schemes/${anId(10)}/imports`]: [LISTED],
  'GET /api/crs/32631': aCrsAnswer(),
};

function openImports(mayUpdate = true) {
  const scheme = aSchemeAnswer({ abilities: { updateRegister: mayUpdate } });
  renderPage(
    <SchemeContext value={scheme}>
      <ImportsPage />
    </SchemeContext>,
  );
}

async function choose(...files: readonly File[]): Promise<void> {
  const input = await screen.findByLabelText('Choose a file of buildings', { selector: 'input' });
  fireEvent.change(input, { target: { files } });
}

describe('bringing a file in', () => {
  it('lists what was brought in before', async () => {
    fakeApi(ANSWERS);
    openImports();
    const link = await screen.findByRole('link', { name: 'town.geojson' });
    expect(link.getAttribute('href')).toBe(`/schemes/${anId(10)}/register/imports/${anId(50)}`);
    expect(screen.getByText('Waiting for you')).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
  });

  it('says so when there was nothing', async () => {
    fakeApi({ ...ANSWERS, [`GET /api/schemes/${anId(10)}/imports`]: [] });
    openImports();
    expect(await screen.findByText('None yet. The first one stands here.')).toBeTruthy();
  });

  it('sends what is chosen or dropped, tells how much has gone, and can stop', async () => {
    fakeApi(ANSWERS);
    const upload = vi.mocked(apiUpload).mockImplementation(({ onProgress, signal }) => {
      onProgress({ sent: 2048, total: 4096 });
      return new Promise((_, reject) => {
        signal.addEventListener('abort', () => {
          reject(new DOMException('cancelled', 'AbortError'));
        });
      });
    });
    openImports();
    const place = (await screen.findByText('Drop a file here')).parentElement;
    if (place === null) throw new Error('There is no place to drop.');
    fireEvent.drop(place, { dataTransfer: { files: [new File(['x'], 'town.gpkg')] } });
    expect(await screen.findByText('2 of 4 kB, 50 %')).toBeTruthy();
    expect(upload.mock.calls[0]?.[0]).toMatchObject({ method: 'POST' });
    fireEvent.click(screen.getByRole('button', { name: 'Cancel' }));
    expect(await screen.findByText('Drop a file here')).toBeTruthy();
    expect(screen.queryByRole('alert')).toBeNull();
  });

  it('says what is wrong with a file', async () => {
    fakeApi(ANSWERS);
    const fault = new ApiError('unreadable', 'This zip holds no .shp. Add it.', 422);
    vi.mocked(apiUpload).mockRejectedValue(fault);
    openImports();
    await choose(new File(['x'], 'town.zip'));
    expect((await screen.findByRole('alert')).textContent).toBe(
      'Nothing was brought in. This zip holds no .shp. Add it.',
    );
  });

  it('takes one file at a time and none that is empty or too large', async () => {
    fakeApi(ANSWERS);
    openImports();
    const sent = vi.mocked(apiUpload).mockClear();
    const place = (await screen.findByText('Drop a file here')).parentElement;
    if (place === null) throw new Error('There is no place to drop.');
    const files = [new File(['x'], 'town.shp'), new File(['x'], 'town.dbf')];
    fireEvent.drop(place, { dataTransfer: { files } });
    expect(await screen.findByText(/one zip/)).toBeTruthy();
    await choose(new File([], 'town.csv'));
    expect(await screen.findByText(/This file is empty/)).toBeTruthy();
    const large = new File(['x'], 'town.csv');
    Object.defineProperty(large, 'size', { value: 300 * 1024 * 1024 });
    await choose(large);
    await waitFor(() => {
      expect(screen.getByRole('alert').textContent).toContain('300 MB');
    });
    expect(sent).not.toHaveBeenCalled();
  });

  it('is not there for who may not change the register', () => {
    openImports(false);
    expect(screen.getByRole('heading', { name: 'Nothing here' })).toBeTruthy();
  });
});
