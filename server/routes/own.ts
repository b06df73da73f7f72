import { ownLetterParamsSchema } from '../../shared/schemas/own.ts';
import { acknowledgeLetter } from '../commands/acknowledge-letter.ts';
import { crsOfScheme } from '../crs/crs-of-scheme.ts';
import { AppError } from '../errors.ts';
import { findOwnBuildings } from '../models/find-own-buildings.ts';
import { findOwnFigures } from '../models/find-own-figures.ts';
import { findOwnLetters, type FoundOwnLetter } from '../models/find-own-letters.ts';
import { findOwn } from '../models/find-own.ts';
import { heldSettings } from '../models/letter-settings.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { presentOwnLetter, presentOwnLetterText } from '../presenters/own-letter.ts';
import { presentOwn } from '../presenters/own.ts';
import type { Services } from '../services.ts';
import { defineRoute } from './define-route.ts';

type Asked = { readonly services: Services; readonly actor: Actor; readonly scheme: Scheme };

async function lettersOf({ services, actor, scheme }: Asked): Promise<FoundOwnLetter[]> {
  const own = await findOwn(services.database, scheme.id, actor.id);
  return findOwnLetters(services.database, scheme.id, own);
}

/** A letter to somebody else answers like one that is not there. */
async function letterOf(
  { services, actor, scheme }: Asked,
  letterId: string,
): Promise<FoundOwnLetter> {
  const own = await findOwn(services.database, scheme.id, actor.id);
  const [letter] = await findOwnLetters(services.database, scheme.id, own, letterId);
  if (letter === undefined) throw new AppError('not-found');
  return letter;
}

async function answerOwn({ services: { database }, actor, scheme }: Asked) {
  const own = await findOwn(database, scheme.id, actor.id);
  const ids = own.buildings.map(({ id }) => id);
  const [{ definition }, { settings }, letters, buildings, figures] = await Promise.all([
    crsOfScheme(scheme),
    heldSettings(database, scheme),
    findOwnLetters(database, scheme.id, own),
    findOwnBuildings(database, scheme.id, ids),
    findOwnFigures(database, scheme.id, own),
  ]);
  return presentOwn(scheme, definition, { settings, letters, buildings, figures });
}

export const ownRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/own',
    access: { scheme: 'readOwnBuildings' },
    handle: answerOwn,
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/own/letters',
    access: { scheme: 'readOwnBuildings' },
    handle: async (call) => (await lettersOf(call)).map(presentOwnLetter),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/own/letters/:ownLetterId',
    access: { scheme: 'readOwnBuildings' },
    params: ownLetterParamsSchema,
    handle: async (call) => presentOwnLetterText(await letterOf(call, call.params.ownLetterId)),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/own/letters/:ownLetterId/acknowledge',
    access: { scheme: 'answerAsOwner' },
    params: ownLetterParamsSchema,
    handle: async (call) => {
      const { services, actor, scheme, params } = call;
      await acknowledgeLetter(services, actor, scheme, await letterOf(call, params.ownLetterId));
      return presentOwnLetter(await letterOf(call, params.ownLetterId));
    },
  }),
];
