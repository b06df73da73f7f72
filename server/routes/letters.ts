import {
  batchParamsSchema,
  batchPreviewSchema,
  checkBatchSchema,
  newBatchSchema,
} from '../../shared/schemas/letter-batches.ts';
import type { LetterSettings } from '../../shared/schemas/letter-settings.ts';
import {
  acknowledgementSchema,
  lettersQuerySchema,
  writtenLetterParamsSchema,
} from '../../shared/schemas/letters.ts';
import { checkLetters } from '../commands/check-letters.ts';
import { readBatch } from '../commands/kept-batch.ts';
import { prepareLetters } from '../commands/prepare-letters.ts';
import { recordAcknowledgement } from '../commands/record-acknowledgement.ts';
import { recordPrinting } from '../commands/record-printing.ts';
import { sendLetters } from '../commands/send-letters.ts';
import { withdrawLetters } from '../commands/withdraw-letters.ts';
import { lettersPdf } from '../documents/letter/letter-pdf.ts';
import { AppError } from '../errors.ts';
import { findRecipients } from '../letters/find-recipients.ts';
import { findEarlierOf, findEarlierOfBatch } from '../models/earlier-letters.ts';
import { findBatches, findBatchText } from '../models/letter-batches.ts';
import { findChosen, findExceptions } from '../models/letter-exceptions.ts';
import { heldSettings } from '../models/letter-settings.ts';
import { findLetters } from '../models/letters.ts';
import { Run } from '../models/run.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import {
  presentBatch,
  presentEarlier,
  presentLetter,
  presentListedLetter,
  presentRecipients,
} from '../presenters/letters.ts';
import type { Services } from '../services.ts';
import { defineRoute } from './define-route.ts';

const BATCHES = '/api/schemes/:schemeId/letter-batches';
const LETTERS = '/api/schemes/:schemeId/letters';

/** A batch as it stands after a step. */
async function answerBatch({ database }: Services, { id }: Scheme, batchId: string) {
  return presentBatch(await readBatch(database, id, batchId));
}

/** The letter that may still be seen; an erased one is there for the administrator alone. */
async function letterToSee({ database }: Services, scheme: Scheme, actor: Actor, letterId: string) {
  const [letter] = await findLetters(database, scheme.id, { letterId });
  const presented = letter === undefined ? null : presentLetter(letter, actor);
  if (letter === undefined || presented === null) throw new AppError('not-found');
  return { letter, presented };
}

/** After how many days without an answer a letter is late in which way. */
const DAYS_WITHOUT = {
  answer: ({ answerWithin }: LetterSettings) => answerWithin,
  call: ({ escalateAfter }: LetterSettings) => escalateAfter,
};

export const letterRoutes = [
  defineRoute({
    method: 'get',
    path: BATCHES,
    access: { scheme: 'readLetters' },
    handle: async ({ services, scheme }) =>
      (await findBatches(services.database, scheme.id)).map(presentBatch),
  }),
  defineRoute({
    method: 'post',
    path: `${BATCHES}/preview`,
    access: { scheme: 'prepareLetters' },
    body: batchPreviewSchema,
    bodyLimit: '1mb',
    handle: async ({ services: { database }, scheme, body }) => {
      const { settings } = await heldSettings(database, scheme);
      const found = await findRecipients(database, scheme.id, settings, body, null);
      const run = found.runId === null ? null : await Run.findByPk(found.runId);
      const of = { schemeId: scheme.id, kind: body.kind };
      const parties = found.recipients.map(({ party }) => party);
      const earlier = await findEarlierOf(database, of, parties);
      return presentRecipients(found, run?.number ?? null, earlier);
    },
  }),
  defineRoute({
    method: 'post',
    path: BATCHES,
    access: { scheme: 'prepareLetters' },
    body: newBatchSchema,
    bodyLimit: '1mb',
    status: 201,
    handle: async ({ services, actor, scheme, body }) => {
      const id = await prepareLetters(services, actor, scheme, body);
      return answerBatch(services, scheme, id);
    },
  }),
  defineRoute({
    method: 'get',
    path: `${BATCHES}/:batchId`,
    access: { scheme: 'readLetters' },
    params: batchParamsSchema,
    handle: async ({ services: { database }, actor, scheme, params: { batchId } }) => {
      const batch = await readBatch(database, scheme.id, batchId);
      const [letters, earlier, leftOut, chosen, text] = await Promise.all([
        findLetters(database, scheme.id, { batchId }),
        findEarlierOfBatch(database, scheme.id, batch),
        findExceptions(database, batchId, actor.isAdministrator),
        findChosen(database, batchId, actor.isAdministrator),
        findBatchText(database, batchId),
      ]);
      return {
        batch: presentBatch(batch),
        text,
        letters: letters.map((letter) => presentListedLetter(letter, actor)),
        earlier: presentEarlier(letters, earlier),
        leftOut,
        chosen,
      };
    },
  }),
  defineRoute({
    method: 'post',
    path: `${BATCHES}/:batchId/check`,
    access: { scheme: 'checkLetters' },
    params: batchParamsSchema,
    body: checkBatchSchema,
    handle: async ({ services, actor, scheme, params: { batchId }, body }) => {
      await checkLetters(services, actor, scheme, { batchId, ...body });
      return answerBatch(services, scheme, batchId);
    },
  }),
  defineRoute({
    method: 'post',
    path: `${BATCHES}/:batchId/withdraw`,
    access: { scheme: 'prepareLetters' },
    params: batchParamsSchema,
    handle: async ({ services, actor, scheme, params: { batchId } }) => {
      await withdrawLetters(services, actor, scheme, batchId);
      return answerBatch(services, scheme, batchId);
    },
  }),
  defineRoute({
    method: 'post',
    path: `${BATCHES}/:batchId/send`,
    access: { scheme: 'checkLetters' },
    params: batchParamsSchema,
    handle: async ({ services, actor, scheme, params: { batchId } }) => {
      await sendLetters(services, actor, scheme, batchId);
      return answerBatch(services, scheme, batchId);
    },
  }),
  defineRoute({
    method: 'get',
    path: `${BATCHES}/:batchId/print-file`,
    access: { scheme: 'readLetters' },
    params: batchParamsSchema,
    handle: async ({ services, scheme, params: { batchId }, res }) => {
      const { number } = await readBatch(services.database, scheme.id, batchId);
      const which = { batchId, byPost: true };
      const found = await findLetters(services.database, scheme.id, which);
      const letters = found.filter(({ isErased }) => !isErased);
      if (letters.length === 0) throw new AppError('not-found', 'No letter of these goes by post.');
      const bytes = await lettersPdf(services, scheme.id, letters, true);
      res.attachment(`letters-${number}-for-the-post.pdf`).type('application/pdf').end(bytes);
    },
  }),
  defineRoute({
    method: 'post',
    path: `${BATCHES}/:batchId/printed`,
    access: { scheme: 'prepareLetters' },
    params: batchParamsSchema,
    handle: async ({ services, actor, scheme, params: { batchId } }) => {
      await recordPrinting(services, actor, scheme, batchId);
      return answerBatch(services, scheme, batchId);
    },
  }),
  defineRoute({
    method: 'get',
    path: LETTERS,
    access: { scheme: 'readLetters' },
    query: lettersQuerySchema,
    handle: async ({ services: { database }, actor, scheme, query }) => {
      const { settings } = await heldSettings(database, scheme);
      const letters = await findLetters(database, scheme.id, {
        buildingId: query.building,
        partyId: query.party,
        unansweredFor: query.overdue && DAYS_WITHOUT[query.overdue](settings),
      });
      return letters.map((letter) => presentListedLetter(letter, actor));
    },
  }),
  defineRoute({
    method: 'get',
    path: `${LETTERS}/:writtenLetterId`,
    access: { scheme: 'readLetters' },
    params: writtenLetterParamsSchema,
    handle: async ({ services, actor, scheme, params }) =>
      (await letterToSee(services, scheme, actor, params.writtenLetterId)).presented,
  }),
  defineRoute({
    method: 'get',
    path: `${LETTERS}/:writtenLetterId/pdf`,
    access: { scheme: 'readLetters' },
    params: writtenLetterParamsSchema,
    handle: async ({ services, actor, scheme, params, res }) => {
      const { letter } = await letterToSee(services, scheme, actor, params.writtenLetterId);
      const bytes = await lettersPdf(services, scheme.id, [letter], false);
      const name = `letter-${letter.batchNumber}-${letter.number}.pdf`;
      res.attachment(name).type('application/pdf').end(bytes);
    },
  }),
  defineRoute({
    method: 'post',
    path: `${LETTERS}/:writtenLetterId/acknowledgement`,
    access: { scheme: 'prepareLetters' },
    params: writtenLetterParamsSchema,
    body: acknowledgementSchema,
    handle: async ({ services, actor, scheme, params: { writtenLetterId }, body }) => {
      const asked = { letterId: writtenLetterId, how: body.how };
      await recordAcknowledgement(services, actor, scheme, asked);
    },
  }),
];
