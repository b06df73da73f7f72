import { randomUUID } from 'node:crypto';
import { simpleParser, type AddressObject } from 'mailparser';
import type { Logger } from 'pino';
import { SMTPServer, type SMTPServerDataStream } from 'smtp-server';
import { MailboxLetter } from '../models/mailbox-letter.ts';

const LARGEST = 5 * 1024 * 1024;

export type Sink = { readonly url: string; readonly close: () => Promise<void> };

function addresses(found: AddressObject | AddressObject[] | undefined): string {
  if (found === undefined) return '';
  return [found].flat().map(({ text }) => text).join(', '); // prettier-ignore
}

/** Reads to the end, as the sender waits for it, but holds no more than a letter may have. */
async function contentOf(stream: SMTPServerDataStream): Promise<Buffer> {
  const chunks: Buffer[] = [];
  for await (const chunk of stream) {
    if (stream.byteLength <= LARGEST) chunks.push(Buffer.from(chunk as Uint8Array));
  }
  if (stream.sizeExceeded) throw new Error('The letter is too large.');
  return Buffer.concat(chunks);
}

/** Keeps a letter, unless one with its Message-ID is there: that one was sent twice. */
async function keep(stream: SMTPServerDataStream): Promise<void> {
  const parsed = await simpleParser(await contentOf(stream));
  const { messageId, from, to, subject, text, html } = parsed;
  await MailboxLetter.bulkCreate(
    [
      {
        messageId: messageId ?? `<${randomUUID()}@mailbox>`,
        sender: addresses(from),
        recipient: addresses(to),
        subject: subject ?? '',
        text: text ?? '',
        html: html === false ? null : (html ?? null),
      },
    ],
    { ignoreDuplicates: true },
  );
}

/** Takes in the demo's mail on a free port of this machine, for the mailbox; nothing goes further. */
export function startSink({ logger }: { readonly logger: Logger }): Promise<Sink> {
  const server = new SMTPServer({
    disabledCommands: ['AUTH', 'STARTTLS'],
    size: LARGEST,
    logger: false,
    onData: (stream, _session, done) => {
      keep(stream).then(() => {
        done();
      }, done);
    },
  });
  server.on('error', (error) => {
    logger.error({ err: error }, 'the mailbox has trouble');
  });
  return new Promise((resolve, reject) => {
    server.server.once('error', reject);
    const listening = server.listen(0, '127.0.0.1', () => {
      const address = listening.address();
      const port = typeof address === 'object' ? (address?.port ?? 0) : 0;
      resolve({
        url: `smtp://127.0.0.1:${port}`,
        close: () =>
          new Promise((closed) => {
            server.close(closed);
          }),
      });
    });
  });
}
