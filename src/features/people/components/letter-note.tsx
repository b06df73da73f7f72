import type { InvitedAnswer } from '../../../../shared/schemas/people.ts';
import { DoneNote } from '../../../components/ui/done-note.tsx';
import { ErrorNote } from '../../../components/ui/error-note.tsx';

/** Whether an invitation went out. The account stands either way. */
export function LetterNote({ invited }: { readonly invited: InvitedAnswer }) {
  const { person, letterSent } = invited;
  if (letterSent) {
    return (
      <DoneNote>
        The invitation to <b className="font-semibold break-words">{person.email}</b> went out.
      </DoneNote>
    );
  }
  return (
    <ErrorNote
      failed={`The letter to ${person.email} did not go out.`}
      stands="The account is made. Open their row and send the invitation again."
    />
  );
}
