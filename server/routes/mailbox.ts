import { z } from 'zod';
import { AppError } from '../errors.ts';
import { MailboxLetter } from '../models/mailbox-letter.ts';
import { presentMailboxEntry, presentMailboxLetter } from '../presenters/mailbox-letter.ts';
import type { Services } from '../services.ts';
import { defineRoute } from './define-route.ts';

const MOST = 200;
const LARGEST_ID = 2 ** 31 - 1;
const letterParams = z.object({ letterId: z.coerce.number().int().min(1).max(LARGEST_ID) });

function requireDemo({ env }: Services): void {
  if (!env.DEMO) throw new AppError('not-found');
}

export const mailboxRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/mailbox',
    access: 'administrator',
    handle: async ({ services }) => {
      requireDemo(services);
      const letters = await MailboxLetter.findAll({
        // what came with them is large
        attributes: { exclude: ['attachments', 'text', 'html'] },
        order: [['id', 'desc']],
        limit: MOST,
      });
      return letters.map(presentMailboxEntry);
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/mailbox/:letterId',
    access: 'administrator',
    params: letterParams,
    handle: async ({ services, params }) => {
      requireDemo(services);
      const letter = await MailboxLetter.findByPk(params.letterId);
      if (letter === null) throw new AppError('not-found');
      return presentMailboxLetter(letter);
    },
  }),
];
