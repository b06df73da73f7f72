import { fireEvent, screen, waitFor } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { BackgroundPage } from '../../../../src/app/routes/settings-background.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { ApiError } from '../../../../src/lib/api-error.ts';
import { apiUpload } from '../../../../src/lib/api-upload.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

vi.mock('../../../../src/lib/api-upload.ts', () => ({ apiUpload: vi.fn() }));

const BACKGROUND = `/api/schemes/${anId(10)}/background`;
const LAYERS = {
  [`GET ${BACKGROUND}`]: [
    { layer: 'streets', features: 1204 },
    { layer: 'water', features: 0 },
  ],
};

function openBackground(mayUpdate = true) {
  const scheme = aSchemeAnswer({ abilities: { readRegister: true, updateBackground: mayUpdate } });
  renderPage(
    <SchemeContext value={scheme}>
      <BackgroundPage />
    </SchemeContext>,
  );
}

async function chooseFile(): Promise<void> {
  const input = await screen.findByLabelText('Bring in a file for water', { selector: 'input' });
  fireEvent.change(input, { target: { files: [new File(['x'], 'water.zip')] } });
}

describe('the background', () => {
  it('says what each layer holds', async () => {
    fakeApi(LAYERS);
    openBackground();
    expect(await screen.findByText('1 204 features')).toBeTruthy();
    expect(screen.getByText('Nothing yet')).toBeTruthy();
    expect(screen.getAllByRole('button', { name: /^Remove/ })).toHaveLength(1);
    expect(await axeFaults()).toEqual([]);
  });

  it('tells how much of a file has gone, and can stop it', async () => {
    fakeApi(LAYERS);
    const upload = vi.mocked(apiUpload).mockImplementation(({ onProgress, signal }) => {
      onProgress({ sent: 2048, total: 4096 });
      return new Promise((_, reject) => {
        signal.addEventListener('abort', () => {
          reject(new DOMException('cancelled', 'AbortError'));
        });
      });
    });
    openBackground();
    await chooseFile();
    expect(await screen.findByText('2 of 4 kB, 50 %')).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Cancel' }));
    await waitFor(() => {
      expect(screen.queryByRole('progressbar')).toBeNull();
    });
    expect(screen.queryByRole('alert')).toBeNull();
    expect(upload).toHaveBeenCalledOnce();
  });

  it('says what is wrong with a file and that nothing was brought in', async () => {
    fakeApi(LAYERS);
    const fault = new ApiError('unreadable', 'Feature 12 has no geometry.', 422);
    vi.mocked(apiUpload).mockRejectedValue(fault);
    openBackground();
    await chooseFile();
    expect((await screen.findByRole('alert')).textContent).toBe(
      'Nothing was brought in; what was there before stands. Feature 12 has no geometry.',
    );
  });

  it('says how much was brought in', async () => {
    fakeApi({ ...LAYERS, [`GET /api/schemes/${anId(10)}`]: aSchemeAnswer() });
    const answer = { layer: 'water', features: 12, backgroundVersion: 2 };
    vi.mocked(apiUpload).mockResolvedValue(answer);
    openBackground();
    await chooseFile();
    expect(await screen.findByText('12 brought in.')).toBeTruthy();
  });

  it('loses a layer once that is confirmed', async () => {
    const { calls } = fakeApi({ ...LAYERS, [`DELETE ${BACKGROUND}/streets`]: {} });
    openBackground();
    fireEvent.click(await screen.findByRole('button', { name: 'Remove streets' }));
    fireEvent.click(screen.getByRole('button', { name: 'Remove it' }));
    await waitFor(() => {
      expect(calls.map(({ route }) => route)).toContain(`DELETE ${BACKGROUND}/streets`);
    });
  });

  it('is only read by who may not change it', async () => {
    fakeApi(LAYERS);
    openBackground(false);
    expect(await screen.findByText('1 204 features')).toBeTruthy();
    expect(screen.queryByRole('button')).toBeNull();
    expect(screen.queryByLabelText(/^Bring in/)).toBeNull();
  });
});
