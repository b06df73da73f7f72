import type { Letter } from '../../server/mail/mailer.ts';

/** The token in the link of a letter. */
export function tokenOf(letter: Letter | undefined): string {
  const token = /\/links\/([\w-]+)/.exec(letter?.text ?? '')?.[1];
  if (token === undefined) throw new Error('There is no link in the letter.');
  return token;
}
