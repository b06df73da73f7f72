import {
  MATTER_LIMITS,
  matterParamsSchema,
  matterPhotographParamsSchema,
  newMatterSchema,
  ownMessageSchema,
} from '../../shared/schemas/matters.ts';
import { addOwnMessage } from '../commands/add-own-message.ts';
import { keepMatterPhotograph } from '../commands/keep-matter-photograph.ts';
import { openMatter } from '../commands/open-matter.ts';
import { AppError } from '../errors.ts';
import { receiveFile } from '../middleware/receive-file.ts';
import { findOwn } from '../models/find-own.ts';
import { findMatterPhotograph, type MatterPhotograph } from '../models/matter-photographs.ts';
import { findMatterThreads } from '../models/matters.ts';
import { sendPhotograph } from '../photographs/send-photograph.ts';
import { presentOwnMatter } from '../presenters/matter.ts';
import type { Services } from '../services.ts';
import { defineRoute } from './define-route.ts';

type Place = { readonly matterId: string; readonly matterPhotographId: string };

async function findOwnPhotograph(
  { database }: Services,
  whose: { readonly schemeId: string; readonly personId: string },
  place: Place,
): Promise<MatterPhotograph> {
  const { parties } = await findOwn(database, whose.schemeId, whose.personId);
  const found = await findMatterPhotograph(database, whose.schemeId, place, parties);
  if (found === undefined) throw new AppError('not-found');
  return found;
}

export const ownMatterRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/own/matters',
    access: { scheme: 'readOwnBuildings' },
    handle: async ({ services: { database }, actor, scheme }) => {
      const { parties } = await findOwn(database, scheme.id, actor.id);
      return (await findMatterThreads(database, scheme.id, { parties })).map(presentOwnMatter);
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/own/matters',
    access: { scheme: 'answerAsOwner' },
    body: newMatterSchema,
    handle: async ({ services, actor, scheme, body, res }) => {
      const { matter, isNew } = await openMatter(services, actor, scheme, body);
      res.status(isNew ? 201 : 200).json(presentOwnMatter(matter));
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/own/matters/:matterId/messages',
    access: { scheme: 'answerAsOwner' },
    params: matterParamsSchema,
    body: ownMessageSchema,
    handle: async ({ services, actor, scheme, params, body, res }) => {
      const message = { ...body, matterId: params.matterId };
      const { matter, isNew } = await addOwnMessage(services, actor, scheme, message);
      res.status(isNew ? 201 : 200).json(presentOwnMatter(matter));
    },
  }),
  defineRoute({
    method: 'put',
    path: '/api/schemes/:schemeId/own/matters/:matterId/photographs/:matterPhotographId',
    access: { scheme: 'answerAsOwner' },
    params: matterPhotographParamsSchema,
    handle: async ({ services, actor, scheme, params, req, res }) => {
      const whose = { schemeId: scheme.id, personId: actor.id };
      const photograph = await findOwnPhotograph(services, whose, params);
      const sent = await receiveFile(req, res, MATTER_LIMITS.photographBytes);
      const { type, bytes } = await keepMatterPhotograph(services, scheme, photograph, sent);
      return { id: photograph.id, type, bytes };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/own/matters/:matterId/photographs/:matterPhotographId',
    access: { scheme: 'readOwnBuildings' },
    params: matterPhotographParamsSchema,
    handle: async ({ actor, scheme, params, ...call }) => {
      const whose = { schemeId: scheme.id, personId: actor.id };
      await sendPhotograph(call, await findOwnPhotograph(call.services, whose, params));
    },
  }),
];
