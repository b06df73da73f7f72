import { fireEvent, screen, waitFor } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { ForgotPasswordPage } from '../../../../src/app/routes/forgot-password.tsx';
import { ChoosePasswordForm } from '../../../../src/features/links/components/choose-password-form.tsx';
import { ChangePasswordForm } from '../../../../src/features/session/components/change-password-form.tsx';
import { SignInForm } from '../../../../src/features/session/components/sign-in-form.tsx';
import { SignOutEverywhere } from '../../../../src/features/session/components/sign-out-everywhere.tsx';
import { queryClient, SESSION_KEY } from '../../../../src/lib/query-client.ts';
import { aSession } from '../../../support/answers.ts';
import { axeFaults } from '../../../support/axe-faults.ts';
import { fakeApi, Refusal } from '../../../support/fake-api.ts';
import { renderPage } from '../../../support/render-page.tsx';

function type(label: string, value: string): void {
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
}

function press(name: string): void {
  fireEvent.click(screen.getByRole('button', { name }));
}

describe('SignInForm', () => {
  it('asks for what is missing before it asks the server', async () => {
    const { calls } = fakeApi({});
    renderPage(<SignInForm />);
    press('Sign in');
    expect(await screen.findByText('Type your password.')).toBeTruthy();
    expect(screen.getByText(/^Type an e-mail address/)).toBeTruthy();
    expect(calls).toEqual([]);
    expect(await axeFaults()).toEqual([]);
  });

  it('keeps the session that it begins, and forgets what another one fetched', async () => {
    queryClient.setQueryData(['people'], ['somebody']);
    const { calls } = fakeApi({ 'POST /api/session': aSession() });
    renderPage(<SignInForm />);
    type('E-mail', ' Assessor@example.org ');
    type('Password', 'groundsill-demo');
    press('Sign in');
    await waitFor(() => {
      expect(queryClient.getQueryData(SESSION_KEY)).toEqual(aSession());
    });
    expect(queryClient.getQueryData(['people'])).toBeUndefined();
    expect(calls[0]?.body).toEqual({ email: 'assessor@example.org', password: 'groundsill-demo' });
  });

  it('does not tell which of the two is wrong', async () => {
    const wrong = new Refusal(401, 'wrong-credentials', 'E-mail or password is not right.');
    fakeApi({ 'POST /api/session': wrong, 'GET /api/session': aSession(null) });
    renderPage(<SignInForm />);
    type('E-mail', 'assessor@example.org');
    type('Password', 'nonsense');
    press('Sign in');
    expect((await screen.findByRole('alert')).textContent).toBe(
      'You are not signed in. E-mail or password is not right.',
    );
  });
});

describe('ForgotPasswordPage', () => {
  it('says the same whether the address is known or not', async () => {
    fakeApi({ 'POST /api/password-resets': {} });
    renderPage(<ForgotPasswordPage />);
    type('E-mail', 'anybody@example.org');
    press('Send the link');
    expect((await screen.findByRole('status')).textContent).toContain(
      'If anybody@example.org has an account',
    );
  });
});

describe('ChoosePasswordForm', () => {
  const link = { purpose: 'invitation', email: 'clerk@example.org', name: 'Clerk' } as const;

  it('says what the server does not take beside the field, and goes in once it does', async () => {
    const fields = [{ path: 'password', message: 'Use something else.' }];
    const answers = [new Refusal(422, 'invalid-input', 'Not right.', fields), aSession()];
    fakeApi({ 'POST /api/links/t%2Fk': () => answers.shift() });
    const onDone = vi.fn();
    renderPage(<ChoosePasswordForm token="t/k" link={link} onDone={onDone} />);
    type('Password', 'short');
    press('Set the password and go in');
    expect(await screen.findByText('Use at least 12 characters.')).toBeTruthy();
    type('Password', 'clerk@example.org');
    press('Set the password and go in');
    expect(await screen.findByText('Use something else.')).toBeTruthy();
    expect(onDone).not.toHaveBeenCalled();
    type('Password', 'harbour wall at low tide');
    press('Set the password and go in');
    await waitFor(() => {
      expect(onDone).toHaveBeenCalledOnce();
    });
    expect(await axeFaults()).toEqual([]);
  });
});

describe('ChangePasswordForm', () => {
  it('takes up the new token of the session and empties itself', async () => {
    fakeApi({ 'PUT /api/session/password': { ...aSession(), csrfToken: 'another' } });
    renderPage(<ChangePasswordForm email="assessor@example.org" />);
    type('The one you have', 'groundsill-demo');
    type('The new one', 'harbour wall at low tide');
    press('Change the password');
    expect((await screen.findByRole('status')).textContent).toContain('You stay signed in here.');
    expect(queryClient.getQueryData(SESSION_KEY)).toMatchObject({ csrfToken: 'another' });
    expect(screen.getByLabelText<HTMLInputElement>('The new one').value).toBe('');
  });
});

describe('SignOutEverywhere', () => {
  it('asks first', async () => {
    const { calls } = fakeApi({ 'DELETE /api/sessions': aSession(null) });
    renderPage(<SignOutEverywhere />);
    press('Sign out everywhere');
    expect(calls).toEqual([]);
    const [, confirm] = screen.getAllByRole('button', { name: 'Sign out everywhere' });
    fireEvent.click(confirm ?? document.body);
    await waitFor(() => {
      expect(queryClient.getQueryData(SESSION_KEY)).toEqual(aSession(null));
    });
  });
});
