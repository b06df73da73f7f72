import {
  ownLetterSchema,
  ownLetterTextSchema,
  type OwnLetter,
  type OwnLetterText,
} from '../../shared/schemas/own.ts';
import type { FoundOwnLetter } from '../models/find-own-letters.ts';

/** What leaves the server, to whom it went, of a letter that was sent. */
export function presentOwnLetter(letter: FoundOwnLetter): OwnLetter {
  return ownLetterSchema.parse({
    id: letter.id,
    subject: letter.subject,
    sentAt: letter.sentAt.toISOString(),
    answerBy: letter.answerBy,
    acknowledgedAt: letter.acknowledgedAt?.toISOString() ?? null,
    buildings: letter.buildings,
  });
}

/** The same with its text, as it was sent; the link in it leads to where it is read here. */
export function presentOwnLetterText(letter: FoundOwnLetter): OwnLetterText {
  return ownLetterTextSchema.parse({
    ...presentOwnLetter(letter),
    name: letter.name,
    parts: letter.parts.filter((part) => typeof part === 'string' || 'list' in part),
  });
}
