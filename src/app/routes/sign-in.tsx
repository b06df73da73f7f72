import { useQuery } from '@tanstack/react-query';
import { Navigate, useLocation } from 'react-router-dom';
import { PATHS } from '../../config/paths.ts';
import { sessionQuery } from '../../features/session/api/get-session.ts';
import { Doorway } from '../../features/session/components/doorway.tsx';
import { SignInForm } from '../../features/session/components/sign-in-form.tsx';

/** Where one came from before being asked to sign in. */
function cameFrom(state: unknown): string {
  return typeof state === 'string' && state.startsWith('/') ? state : PATHS.schemes;
}

export function SignInPage() {
  const destination = cameFrom(useLocation().state);
  const { data: session } = useQuery(sessionQuery);
  if (session?.person) return <Navigate replace to={destination} />;
  return (
    <Doorway title="Sign in">
      <SignInForm />
      {session?.demo === true && (
        <p className="mt-6 border-t border-hairline pt-3 text-small text-ink-2">
          This is a demo: the town and its people are invented. Its sign-ins were printed where it
          was started.
        </p>
      )}
    </Doorway>
  );
}
