import type { PersonAnswer } from '../../../../shared/schemas/people.ts';
import { DoneNote } from '../../../components/ui/done-note.tsx';

/** An invitation waits to go out. How it fares is told where the person stands. */
export function LetterNote({ person }: { readonly person: PersonAnswer }) {
  return (
    <DoneNote>
      The invitation to <b className="font-semibold break-words">{person.email}</b> is on its way.
    </DoneNote>
  );
}
