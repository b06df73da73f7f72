import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { PASSWORD_LIMITS } from '../../../../shared/schemas/passwords.ts';
import { changePasswordSchema } from '../../../../shared/schemas/session.ts';
import { Button } from '../../../components/ui/button.tsx';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { PasswordField } from '../../../components/ui/password-field.tsx';
import { showFieldFaults } from '../../../lib/form-errors.ts';
import { useChangePassword } from '../api/change-password.ts';
import { UsernameForBrowser } from './username-for-browser.tsx';

/** Changes one's own password. */
export function ChangePasswordForm({ email }: { readonly email: string }) {
  const change = useChangePassword();
  const form = useForm({
    resolver: zodResolver(changePasswordSchema),
    defaultValues: { currentPassword: '', newPassword: '' },
  });
  const { errors } = form.formState;
  const submit = form.handleSubmit((passwords) => {
    change.mutate(passwords, {
      onSuccess: () => {
        form.reset();
      },
      onError: (error) => {
        showFieldFaults(error, form, ['currentPassword', 'newPassword']);
      },
    });
  });
  return (
    <form
      noValidate
      className="mt-3.5 grid max-w-[360px] gap-3.5"
      onSubmit={(event) => void submit(event)}
    >
      <MutationError
        failed="The password was not changed."
        error={change.error}
        shown={['currentPassword', 'newPassword']}
      />
      <UsernameForBrowser email={email} />
      <PasswordField
        label="The one you have"
        autoComplete="current-password"
        error={errors.currentPassword?.message}
        {...form.register('currentPassword')}
      />
      <PasswordField
        label="The new one"
        autoComplete="new-password"
        hint={`At least ${PASSWORD_LIMITS.shortest} characters. Wherever else you are signed in, you are signed out.`}
        error={errors.newPassword?.message}
        {...form.register('newPassword')}
      />
      <div className="flex flex-wrap items-center gap-3">
        <Button kind="main" type="submit" busy={change.isPending}>
          Change the password
        </Button>
        {change.isSuccess && <DoneNote>Changed. You stay signed in here.</DoneNote>}
      </div>
    </form>
  );
}
