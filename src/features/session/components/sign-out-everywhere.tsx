import { useState } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useSignOut } from '../api/sign-out.ts';

/** Ends every session of the person, this one too. */
export function SignOutEverywhere() {
  const [asks, setAsks] = useState(false);
  const signOut = useSignOut('everywhere');
  return (
    <div className="mt-3.5 grid max-w-[52ch] justify-items-start gap-3">
      <p className="text-small text-ink-2">
        If you left yourself signed in on a machine that is not yours, sign out of all of them.
      </p>
      <MutationError failed="You are still signed in." error={signOut.error} />
      <Button
        onClick={() => {
          setAsks(true);
        }}
      >
        Sign out everywhere
      </Button>
      <ConfirmDialog
        open={asks}
        title="Sign out everywhere?"
        doIt="Sign out everywhere"
        busy={signOut.isPending}
        onConfirm={() => {
          signOut.mutate();
        }}
        onClose={() => {
          setAsks(false);
        }}
      >
        You are signed out here too, and sign in again with your password. What you saved stands.
      </ConfirmDialog>
    </div>
  );
}
