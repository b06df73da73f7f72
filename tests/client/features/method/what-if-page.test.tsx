import { fireEvent, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { WhatIfPage } from '../../../../src/features/method/what-if-page.tsx';
import { renderPage } from '../../../support/render-page.tsx';

function write(label: string, text: string, within_ = 0): void {
  const field = screen.getAllByLabelText(label)[within_];
  if (field === undefined) throw new Error(`There is no field ${label}.`);
  fireEvent.change(field, { target: { value: text } });
}

describe('what-if', () => {
  it('starts as the check and follows each change, back again on demand', async () => {
    renderPage(<WhatIfPage />, '/method/what-if');
    expect(screen.getByText(/strain 0\.0379 %/)).toBeTruthy();
    expect(screen.queryByText('Back to the check')).toBeNull();
    write('High', '9');
    write('Central', '5');
    expect(await screen.findByText('slight', { selector: 'b' })).toBeTruthy();
    fireEvent.click(screen.getByText('Back to the check'));
    expect(await screen.findByText(/strain 0\.0379 %/)).toBeTruthy();
  });

  it('reads the address it is opened at', () => {
    renderPage(<WhatIfPage />, '/method/what-if?z=3&d=7');
    expect(screen.getByLabelText<HTMLInputElement>(/Founding depth/).value).toBe('3');
    expect(screen.getByLabelText<HTMLInputElement>(/Diameter/).value).toBe('7');
  });

  it('keeps the last figures that fit and says what is wrong beside its field', async () => {
    renderPage(<WhatIfPage />, '/method/what-if');
    fireEvent.change(screen.getByLabelText(/Founding depth/), { target: { value: '18' } });
    expect(await screen.findByText(/The wall has to be founded above it/)).toBeTruthy();
    expect(screen.getByText(/Shown for the last figures that fit/)).toBeTruthy();
    expect(screen.getByText(/strain 0\.0379 %/)).toBeTruthy();
  });

  it('opens at figures that cannot be worked out and says so', () => {
    renderPage(<WhatIfPage />, '/method/what-if?k=none');
    expect(screen.getByText(/These figures cannot be worked out/)).toBeTruthy();
    expect(screen.getByText('This is no number.')).toBeTruthy();
  });

  it('opens the working of a figure beside it, one at a time, and closes it on Esc', () => {
    renderPage(<WhatIfPage />, '/method/what-if');
    const figure = screen.getByLabelText('0.0379, working of the strain of zone 2');
    fireEvent.click(figure);
    const panel = within(
      screen.getByLabelText(/working of the strain of zone 2/, { selector: '[role=group]' }),
    );
    expect(panel.getByLabelText('ε = max(ε_bt, ε_dt)')).toBeTruthy();
    expect(panel.getAllByText(/Burland 1995/).length).toBeGreaterThan(0);
    fireEvent.keyDown(document, { key: 'Escape' });
    expect(
      screen.queryByLabelText(/working of the strain/, { selector: '[role=group]' }),
    ).toBeNull();
  });
});
