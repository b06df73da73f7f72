import nodemailer from 'nodemailer';
import type { Env } from '../env.ts';

export type Letter = {
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
};

export type Mailer = { readonly send: (letter: Letter) => Promise<void> };

/** Sends through the SMTP server of the environment: the local mailbox in the demo. */
export function createMailer(smtpUrl: string, { MAIL_FROM }: Pick<Env, 'MAIL_FROM'>): Mailer {
  const transport = nodemailer.createTransport(smtpUrl);
  return {
    send: async (letter) => {
      await transport.sendMail({ from: MAIL_FROM, ...letter });
    },
  };
}
