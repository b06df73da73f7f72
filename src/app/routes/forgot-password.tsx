import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { passwordResetSchema } from '../../../shared/schemas/links.ts';
import { Button } from '../../components/ui/button.tsx';
import { Field } from '../../components/ui/field.tsx';
import { MutationError } from '../../components/ui/mutation-error.tsx';
import { PATHS } from '../../config/paths.ts';
import { useRequestPasswordReset } from '../../features/links/api/request-password-reset.ts';
import { Doorway } from '../../features/session/components/doorway.tsx';

function BackToSignIn() {
  return (
    <Link to={PATHS.signIn} className="text-small max-sm:py-3">
      Back to sign in
    </Link>
  );
}

function Asked({ email }: { readonly email: string }) {
  return (
    <div role="status" className="grid gap-4">
      <p className="text-roomy">
        If <b className="font-semibold break-words">{email}</b> has an account, a letter is on its
        way. Its link works once.
      </p>
      <p className="text-small text-ink-2">
        Nothing came? Look among the letters that were sorted out, then ask again.
      </p>
      <BackToSignIn />
    </div>
  );
}

export function ForgotPasswordPage() {
  const request = useRequestPasswordReset();
  const { register, handleSubmit, formState } = useForm({
    resolver: zodResolver(passwordResetSchema),
    defaultValues: { email: '' },
  });
  return (
    <Doorway title="A new password">
      {request.isSuccess ? (
        <Asked email={request.variables.email} />
      ) : (
        <form
          noValidate
          className="grid gap-3.5"
          onSubmit={(event) =>
            void handleSubmit((body) => {
              request.mutate(body);
            })(event)
          }
        >
          <MutationError failed="No letter was sent." error={request.error} />
          <Field
            label="E-mail"
            type="email"
            autoComplete="username"
            hint="We send you a link. The password you have goes on working until you use it."
            error={formState.errors.email?.message}
            {...register('email')}
          />
          <div className="mt-1 flex flex-wrap items-center gap-x-4 gap-y-2">
            <Button kind="main" type="submit" busy={request.isPending}>
              Send the link
            </Button>
            <BackToSignIn />
          </div>
        </form>
      )}
    </Doorway>
  );
}
