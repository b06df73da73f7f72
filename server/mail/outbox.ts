import type { Transaction } from 'sequelize';
import type { LetterPart } from './render-letter.ts';

/** A mail as it is put into the outbox. */
export type OutgoingMail = {
  /** The scheme that it is of; none where it is of somebody’s account. */
  readonly schemeId: string | null;
  /** The address that it goes to. */
  readonly recipient: string;
  readonly subject: string;
  readonly parts: readonly LetterPart[];
  /** The letter that it carries or, in a reminder, speaks of. */
  readonly letterId?: string;
  readonly isReminder?: boolean;
  /** The party whom it concerns, where it carries no letter. */
  readonly partyId?: string;
  /** The single-use link whose address its parts leave open. */
  readonly linkId?: string;
  /** An appointment that comes with it, as a calendar takes it in. */
  readonly calendar?: string;
};

/** Where mails wait to be sent: none is lost once its transaction is committed. */
export type Outbox = {
  /** Mails go out when the transaction that puts them in is committed, or not at all. */
  readonly put: (mails: readonly OutgoingMail[], transaction: Transaction) => Promise<void>;
  /** Calls again for all that waits, at start: a process that died may have had some in hand. */
  readonly recover: () => Promise<number>;
};
