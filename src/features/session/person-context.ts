import { createContext, use } from 'react';
import type { SessionAnswer } from '../../../shared/schemas/session.ts';

/** Who is signed in. */
export type SignedInPerson = NonNullable<SessionAnswer['person']> & {
  /** Whether the demo's mailbox is there. */
  readonly demo: boolean;
};

export const PersonContext = createContext<SignedInPerson | null>(null);

/** Who is signed in, on the pages that only they reach. */
export function usePerson(): SignedInPerson {
  const person = use(PersonContext);
  if (person === null) throw new Error('This page stands outside of the signed-in ones.');
  return person;
}
