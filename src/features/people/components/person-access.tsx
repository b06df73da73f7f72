import { useState } from 'react';
import type { PersonAnswer } from '../../../../shared/schemas/people.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useShutOutPerson } from '../api/shut-out-person.ts';
import { useWithdrawInvitation } from '../api/withdraw-invitation.ts';

function Withdraw({ person }: { readonly person: PersonAnswer }) {
  const withdraw = useWithdrawInvitation(person.id);
  return (
    <>
      <MutationError failed="The invitation stands." error={withdraw.error} />
      <Button
        busy={withdraw.isPending}
        onClick={() => {
          withdraw.mutate();
        }}
      >
        Withdraw the invitation
      </Button>
    </>
  );
}

function ShutOut({ person }: { readonly person: PersonAnswer }) {
  const [isAsking, setAsking] = useState(false);
  const shutOut = useShutOutPerson(person.id);
  function close() {
    setAsking(false);
  }
  return (
    <>
      <MutationError failed="They can still sign in." error={shutOut.error} />
      <Button
        onClick={() => {
          setAsking(true);
        }}
      >
        Shut out
      </Button>
      <ConfirmDialog
        open={isAsking}
        title={`Shut out ${person.name}?`}
        doIt="Shut out"
        busy={shutOut.isPending}
        onConfirm={() => {
          shutOut.mutate(true, { onSettled: close });
        }}
        onClose={close}
      >
        <p>
          They are signed out everywhere and cannot sign in. What they are in schemes stays, and so
          does what they did. You can let them in again.
        </p>
      </ConfirmDialog>
    </>
  );
}

function Readmit({ person }: { readonly person: PersonAnswer }) {
  const readmit = useShutOutPerson(person.id);
  return (
    <>
      <MutationError failed="They are still shut out." error={readmit.error} />
      <Button
        busy={readmit.isPending}
        onClick={() => {
          readmit.mutate(false);
        }}
      >
        Let in again
      </Button>
    </>
  );
}

/** What can be done about how a person comes in. */
export function PersonAccess({ person }: { readonly person: PersonAnswer }) {
  const { withdraw, shutOut, readmit } = person.abilities;
  return (
    <div className="flex flex-wrap gap-2">
      {withdraw && <Withdraw person={person} />}
      {shutOut && <ShutOut person={person} />}
      {readmit && <Readmit person={person} />}
    </div>
  );
}
