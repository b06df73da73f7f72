import { randomUUID } from 'node:crypto';
import type { Outbox } from '../../server/mail/outbox.ts';
import { sendWaiting, type Sending } from '../../server/mail/send-waiting.ts';
import { insertMails } from '../../server/models/outbox-mails.ts';

export type InlineOutbox = Outbox & {
  /** Resolves when everything that was put in has been tried. */
  readonly idle: () => Promise<void>;
};

/** An outbox whose mails are tried one after the other as soon as they are put in. */
export function inlineOutbox(tools: Sending): InlineOutbox {
  let working: Promise<unknown> = Promise.resolve();
  return {
    put: async (mails, transaction) => {
      const numbered = mails.map((mail) => ({ ...mail, id: randomUUID() }));
      await insertMails(tools.database, numbered, transaction);
      transaction.afterCommit(() => {
        for (const { id } of numbered) working = working.then(() => sendWaiting(tools, id));
      });
    },
    recover: () => Promise.resolve(0),
    idle: async () => {
      let seen;
      do {
        seen = working;
        await seen;
      } while (seen !== working);
    },
  };
}
