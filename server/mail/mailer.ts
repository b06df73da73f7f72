import nodemailer from 'nodemailer';
import type { Env } from '../env.ts';

export type Letter = {
  /** Makes the Message-ID: what is sent twice by mischance is one letter to whoever takes it in. */
  readonly id: string;
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
};

export type Mailer = { readonly send: (letter: Letter) => Promise<void> };

/** Sends through the SMTP server of the environment: the local mailbox in the demo. */
export function createMailer(smtpUrl: string, { MAIL_FROM }: Pick<Env, 'MAIL_FROM'>): Mailer {
  const transport = nodemailer.createTransport(smtpUrl);
  const domain = MAIL_FROM.slice(MAIL_FROM.indexOf('@') + 1);
  return {
    send: async ({ id, to, ...words }) => {
      await transport.sendMail({
        from: { name: 'Groundsill', address: MAIL_FROM },
        // as a list of addresses, a comma in one would make two
        to: { name: '', address: to },
        messageId: `<${id}@${domain}>`,
        ...words,
      });
    },
  };
}
