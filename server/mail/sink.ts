import { randomUUID } from 'node:crypto';
import type { Socket } from 'node:net';
import { setTimeout as sleep } from 'node:timers/promises';
import { simpleParser, type AddressObject } from 'mailparser';
import type { Logger } from 'pino';
import { SMTPServer, type SMTPServerDataStream, type SMTPServerSession } from 'smtp-server';
import { MailboxLetter } from '../models/mailbox-letter.ts';

const LARGEST = 5 * 1024 * 1024;

/** What the mailbox does with a letter to an address; without a word it keeps it. */
export type Behaviour =
  | 'keep'
  /** Takes the letter in and hangs up before it says so. */
  | 'drop'
  | { readonly refuse: number; readonly words: string }
  | { readonly delay: number };

type SinkOptions = {
  readonly logger: Logger;
  /** For tests and trials: what is done with a letter to an address. */
  readonly behave?: (recipient: string) => Behaviour;
};

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
  const { messageId, from, to, subject, text, html, attachments } = parsed;
  await MailboxLetter.bulkCreate(
    [
      {
        messageId: messageId ?? `<${randomUUID()}@mailbox>`,
        sender: addresses(from),
        recipient: addresses(to),
        subject: subject ?? '',
        text: text ?? '',
        html: html === false ? null : (html ?? null),
        attachments: attachments.map(({ filename, contentType, content }) => ({
          name: filename ?? 'unnamed',
          type: contentType,
          base64: content.toString('base64'),
        })),
      },
    ],
    { ignoreDuplicates: true },
  );
}

function key({ remoteAddress, remotePort }: SMTPServerSession): string {
  return `${remoteAddress}:${remotePort}`;
}

function refusal(code: number, words: string): Error {
  return Object.assign(new Error(words), { responseCode: code });
}

/** Takes a letter in, or does with it what it is told for its address. */
async function takeIn(
  stream: SMTPServerDataStream,
  { envelope }: SMTPServerSession,
  behave: NonNullable<SinkOptions['behave']>,
): Promise<'answer' | 'hang up'> {
  const asked = behave(envelope.rcptTo[0]?.address ?? '');
  if (typeof asked === 'object' && 'refuse' in asked) {
    await contentOf(stream);
    throw refusal(asked.refuse, asked.words);
  }
  if (typeof asked === 'object') await sleep(asked.delay);
  await keep(stream);
  return asked === 'drop' ? 'hang up' : 'answer';
}

/** Takes in the demo's mail on a free port of this machine, for the mailbox; nothing goes further. */
export function startSink({ logger, behave = () => 'keep' }: SinkOptions): Promise<Sink> {
  const connections = new Map<string, Socket>();
  const server = new SMTPServer({
    disabledCommands: ['AUTH', 'STARTTLS'],
    size: LARGEST,
    logger: false,
    onData: (stream, session, done) => {
      takeIn(stream, session, behave).then((end) => {
        if (end === 'hang up') connections.get(key(session))?.destroy();
        else done();
      }, done);
    },
  });
  server.server.on('connection', (socket: Socket) => {
    const name = `${socket.remoteAddress ?? ''}:${socket.remotePort ?? 0}`;
    connections.set(name, socket);
    socket.once('close', () => connections.delete(name));
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
