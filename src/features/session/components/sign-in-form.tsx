import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { signInSchema } from '../../../../shared/schemas/session.ts';
import { Button } from '../../../components/ui/button.tsx';
import { Field } from '../../../components/ui/field.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { PasswordField } from '../../../components/ui/password-field.tsx';
import { PATHS } from '../../../config/paths.ts';
import { useSignIn } from '../api/sign-in.ts';

/** E-mail and password. Which of the two is wrong, nobody is told. */
export function SignInForm() {
  const signIn = useSignIn();
  const { register, handleSubmit, formState } = useForm({
    resolver: zodResolver(signInSchema),
    defaultValues: { email: '', password: '' },
  });
  const { errors } = formState;
  return (
    <form
      noValidate
      className="grid gap-3.5"
      onSubmit={(event) =>
        void handleSubmit((credentials) => {
          signIn.mutate(credentials);
        })(event)
      }
    >
      <MutationError failed="You are not signed in." error={signIn.error} />
      <Field
        label="E-mail"
        type="email"
        autoComplete="username"
        error={errors.email?.message}
        {...register('email')}
      />
      <PasswordField
        label="Password"
        autoComplete="current-password"
        error={errors.password?.message}
        {...register('password')}
      />
      <div className="mt-1 flex flex-wrap items-center gap-x-4 gap-y-2">
        <Button kind="main" type="submit" busy={signIn.isPending}>
          Sign in
        </Button>
        <Link to={PATHS.forgotPassword} className="text-small max-sm:py-3">
          Forgot your password?
        </Link>
      </div>
    </form>
  );
}
