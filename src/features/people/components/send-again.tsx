import type { PersonAnswer } from '../../../../shared/schemas/people.ts';
import { Button } from '../../../components/ui/button.tsx';
import { ErrorNote } from '../../../components/ui/error-note.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { useInviteAgain } from '../api/invite-again.ts';
import { letterTrouble } from '../person-words.ts';
import { LetterNote } from './letter-note.tsx';

/** Sends the invitation of somebody who has not taken it up once more. */
export function SendAgain({ person }: { readonly person: PersonAnswer }) {
  const invite = useInviteAgain();
  const trouble = letterTrouble(person);
  return (
    <div className="grid justify-items-start gap-2">
      {trouble !== null && <ErrorNote {...trouble} />}
      <MutationError failed="No letter was sent." error={invite.error} />
      <Button
        busy={invite.isPending}
        onClick={() => {
          invite.mutate(person.id);
        }}
      >
        {person.invitedUntil === null ? 'Send an invitation' : 'Send the invitation again'}
      </Button>
      {invite.data !== undefined && <LetterNote person={invite.data} />}
    </div>
  );
}
