import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { NoBuildings } from '../../../../src/features/plan/components/no-buildings.tsx';
import { anId, aSchemeAnswer } from '../../../support/answers.ts';
import { renderPage } from '../../../support/render-page.tsx';

function show(abilities: Record<string, boolean>, hasBackground = false): void {
  renderPage(<NoBuildings scheme={aSchemeAnswer({ abilities })} hasBackground={hasBackground} />);
}

describe('a plan without buildings', () => {
  it('asks an assessor for footprints', () => {
    show({ updateRegister: true, updateBackground: true });
    expect(
      screen.getByText('No buildings yet. Bring in footprints to start the register.'),
    ).toBeTruthy();
    expect(screen.getByRole('link', { name: 'Bring in footprints' }).getAttribute('href')).toBe(
      `/schemes/${anId(10)}/register/imports`,
    );
  });

  it('asks who may for streets and water, and tells others what will stand here', () => {
    show({ updateBackground: true });
    expect(screen.getByRole('link', { name: 'Bring in streets and water' })).toBeTruthy();
    show({ updateBackground: true }, true);
    expect(screen.getByText(/They stand here once the register has some\./)).toBeTruthy();
  });
});
