import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import {
  useLinkSchema as linkAnswerSchema,
  type LinkAnswer,
} from '../../../../shared/schemas/links.ts';
import { PASSWORD_LIMITS } from '../../../../shared/schemas/passwords.ts';
import { Button } from '../../../components/ui/button.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { PasswordField } from '../../../components/ui/password-field.tsx';
import { showFieldFaults } from '../../../lib/form-errors.ts';
import { useFollowLink } from '../api/follow-link.ts';
import { UsernameForBrowser } from '../../session/components/username-for-browser.tsx';

type ChoosePasswordFormProps = {
  readonly token: string;
  readonly link: LinkAnswer;
  readonly onDone: () => void;
};

/** Sets the password that a link lets one choose. */
export function ChoosePasswordForm({ token, link, onDone }: ChoosePasswordFormProps) {
  const follow = useFollowLink(token);
  const form = useForm({
    resolver: zodResolver(linkAnswerSchema),
    defaultValues: { password: '' },
  });
  const submit = form.handleSubmit(({ password }) => {
    follow.mutate(password, {
      onSuccess: onDone,
      onError: (error) => {
        showFieldFaults(error, form, ['password']);
      },
    });
  });
  return (
    <form noValidate className="grid gap-3.5" onSubmit={(event) => void submit(event)}>
      <p className="text-roomy text-ink-2">
        {link.name}, choose a password for{' '}
        <b className="font-semibold break-words text-ink">{link.email}</b>.
      </p>
      <MutationError failed="The password was not set." error={follow.error} shown={['password']} />
      <UsernameForBrowser email={link.email} />
      <PasswordField
        label="Password"
        autoComplete="new-password"
        hint={`At least ${PASSWORD_LIMITS.shortest} characters. A few words in a row are easy to keep in mind.`}
        error={form.formState.errors.password?.message}
        {...form.register('password')}
      />
      <div className="mt-1">
        <Button kind="main" type="submit" busy={follow.isPending}>
          Set the password and go in
        </Button>
      </div>
    </form>
  );
}
