import nodemailer from 'nodemailer';
import type { Env } from '../env.ts';

/** What comes with a letter. */
export type Attachment = {
  readonly filename: string;
  readonly contentType: string;
  readonly content: Buffer | string;
};

export type Letter = {
  /** Makes the Message-ID: what is sent twice by mischance is one letter to whoever takes it in. */
  readonly id: string;
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
  readonly attachments?: readonly Attachment[];
};

export type Mailer = {
  /** Resolves with the server's words once it has taken the letter over. */
  readonly send: (letter: Letter) => Promise<string>;
};

/** In milliseconds: a server that says nothing for so long is taken for gone. */
const PATIENCE = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 20_000 };

/** Sends through the SMTP server of the environment: the local mailbox in the demo. */
export function createMailer(smtpUrl: string, { MAIL_FROM }: Pick<Env, 'MAIL_FROM'>): Mailer {
  const transport = nodemailer.createTransport({ url: smtpUrl, ...PATIENCE });
  const domain = MAIL_FROM.slice(MAIL_FROM.indexOf('@') + 1);
  return {
    send: async ({ id, to, attachments = [], ...words }) => {
      const { response } = await transport.sendMail({
        from: { name: 'Groundsill', address: MAIL_FROM },
        // as a list of addresses, a comma in one would make two
        to: { name: '', address: to },
        messageId: `<${id}@${domain}>`,
        attachments: [...attachments],
        ...words,
      });
      return response;
    },
  };
}
