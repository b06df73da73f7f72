import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { GroundPage } from '../../../../src/app/routes/settings-ground.tsx';
import { SchemeContext } from '../../../../src/features/schemes/scheme-context.ts';
import { ApiError } from '../../../../src/lib/api-error.ts';
import { apiUpload } from '../../../../src/lib/api-upload.ts';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi } from '../../../support/fake-api.ts';
import { aGroundAnswer } from '../../../support/import-answers.ts';
import { renderPage } from '../../../support/render-page.tsx';

vi.mock('../../../../src/lib/api-upload.ts', () => ({ apiUpload: vi.fn() }));

const GROUND = `/api/schemes/${anId(10)}/ground`;
const ANSWERS = {
  'GET /api/session': { csrfToken: 'token', demo: true, person: null },
  [`GET ${GROUND}`]: aGroundAnswer(),
};

function openGround(mayUpdate = true) {
  const abilities = { readRegister: true, updateRegister: mayUpdate };
  renderPage(
    <SchemeContext value={aSchemeAnswer({ abilities })}>
      <GroundPage />
    </SchemeContext>,
  );
}

async function chooseFile(): Promise<void> {
  const input = await screen.findByLabelText('Bring in a file of levels', { selector: 'input' });
  fireEvent.change(input, { target: { files: [new File(['x'], 'levels.csv')] } });
}

describe('the ground', () => {
  it('says what there is and which buildings took it', async () => {
    fakeApi(ANSWERS);
    openGround();
    expect(await screen.findByText('1 204 spot heights')).toBeTruthy();
    expect(screen.getByText('2.5 to 18.25 m')).toBeTruthy();
    expect(screen.getByText('1 190 buildings')).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
  });

  it('is one level for all, once it is written rightly', async () => {
    const { calls } = fakeApi({ ...ANSWERS, [`PUT ${GROUND}`]: aGroundAnswer() });
    openGround();
    fireEvent.change(await screen.findByLabelText('Level above datum, m'), {
      target: { value: '12,5' },
    });
    fireEvent.click(screen.getByRole('button', { name: 'Set the level' }));
    expect(await screen.findByText('Say where the levels come from.')).toBeTruthy();
    fireEvent.change(screen.getByLabelText('Where it comes from'), {
      target: { value: 'Levelling' },
    });
    fireEvent.click(screen.getByRole('button', { name: 'Set the level' }));
    expect(await screen.findByText('Set.')).toBeTruthy();
    expect(calls.find(({ route }) => route.startsWith('PUT'))?.body).toEqual({
      level: 12.5,
      source: 'Levelling',
    });
  });

  it('comes from a file with its source and grid', async () => {
    fakeApi(ANSWERS);
    const upload = vi.mocked(apiUpload).mockResolvedValue(aGroundAnswer());
    openGround();
    await chooseFile();
    expect(await screen.findByText('Say where the levels come from.')).toBeTruthy();
    expect(upload).not.toHaveBeenCalled();
    fireEvent.change(screen.getByLabelText('Where the levels come from'), {
      target: { value: 'Scan' },
    });
    fireEvent.change(screen.getByLabelText('EPSG number of its points'), {
      target: { value: '25830' },
    });
    await chooseFile();
    expect(await screen.findByText('1 204 points brought in.')).toBeTruthy();
    expect(upload.mock.calls[0]?.[0].path).toBe(`${GROUND}/file?source=Scan&crs=25830`);
  });

  it('says by row what is wrong with a file', async () => {
    fakeApi(ANSWERS);
    const faults = Array.from({ length: 50 }, (_, k) => ({
      path: `row ${k + 2}`,
      message: `Row ${k + 2}: column “z” is blank.`,
    }));
    const message = '1 204 places cannot be read; the first 50 are listed.';
    vi.mocked(apiUpload).mockRejectedValue(new ApiError('unreadable', message, 422, faults));
    openGround();
    fireEvent.change(await screen.findByLabelText('Where the levels come from'), {
      target: { value: 'Scan' },
    });
    await chooseFile();
    expect((await screen.findByRole('alert')).textContent).toContain(message);
    const list = screen.getByRole('list', { name: 'What is wrong' });
    expect(within(list).getAllByRole('listitem')).toHaveLength(50);
    expect(within(list).getByText('Row 12: column “z” is blank.')).toBeTruthy();
    expect(await axeFaults()).toEqual([]);
  });

  it('is taken away once that is confirmed', async () => {
    const { calls } = fakeApi({ ...ANSWERS, [`DELETE ${GROUND}`]: undefined });
    openGround();
    fireEvent.click(await screen.findByRole('button', { name: 'Remove' }));
    fireEvent.click(screen.getByRole('button', { name: 'Remove it' }));
    await waitFor(() => {
      expect(calls.some(({ route }) => route === `DELETE ${GROUND}`)).toBe(true);
    });
  });

  it('is only read by who may not change the register', async () => {
    fakeApi({ ...ANSWERS, [`GET ${GROUND}`]: aGroundAnswer({ ground: null }) });
    openGround(false);
    expect(await screen.findByText(/^No ground yet/)).toBeTruthy();
    expect(screen.queryByRole('button')).toBeNull();
  });
});
