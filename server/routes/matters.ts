import {
  changeMatterSchema,
  matterParamsSchema,
  matterPhotographParamsSchema,
  mattersQuerySchema,
  takeSuggestionSchema,
  teamMessageSchema,
} from '../../shared/schemas/matters.ts';
import { answerMatter } from '../commands/answer-matter.ts';
import { changeMatter } from '../commands/change-matter.ts';
import { readMatter } from '../commands/kept-matter.ts';
import { takeSuggestion } from '../commands/take-suggestion.ts';
import { AppError } from '../errors.ts';
import { findAssessors } from '../models/find-assessors.ts';
import { findMatterPhotograph } from '../models/matter-photographs.ts';
import { findMatters, type FoundMatter } from '../models/matters.ts';
import type { Scheme } from '../models/scheme.ts';
import { sendPhotograph } from '../photographs/send-photograph.ts';
import { presentMatter, presentMatterLine } from '../presenters/matter.ts';
import type { Services } from '../services.ts';
import { defineRoute } from './define-route.ts';

async function answerWith({ database }: Services, scheme: Scheme, matter: FoundMatter) {
  return presentMatter(matter, await findAssessors(database, scheme.id));
}

export const matterRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/matters',
    access: { scheme: 'readMatters' },
    query: mattersQuerySchema,
    handle: async ({ services: { database }, actor, scheme, query }) => {
      const [matters, assessors] = await Promise.all([
        findMatters(database, scheme.id, query, actor.id),
        findAssessors(database, scheme.id),
      ]);
      const total = matters[0]?.total ?? 0;
      return { total, matters: matters.map(presentMatterLine), assessors };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/matters/:matterId',
    access: { scheme: 'readMatters' },
    params: matterParamsSchema,
    handle: async ({ services, scheme, params }) => {
      const which = { id: params.matterId };
      return answerWith(services, scheme, await readMatter(services.database, scheme.id, which));
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/matters/:matterId/messages',
    access: { scheme: 'answerMatters' },
    params: matterParamsSchema,
    body: teamMessageSchema,
    handle: async ({ services, actor, scheme, params, body, res }) => {
      const message = { ...body, matterId: params.matterId };
      const { matter, isNew } = await answerMatter(services, actor, scheme, message);
      res.status(isNew ? 201 : 200).json(await answerWith(services, scheme, matter));
    },
  }),
  defineRoute({
    method: 'patch',
    path: '/api/schemes/:schemeId/matters/:matterId',
    access: { scheme: 'answerMatters' },
    params: matterParamsSchema,
    body: changeMatterSchema,
    handle: async ({ services, actor, scheme, params, body }) => {
      const asked = { ...body, id: params.matterId };
      return answerWith(services, scheme, await changeMatter(services, actor, scheme, asked));
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/matters/:matterId/taking-over',
    access: { scheme: 'answerMatters' },
    params: matterParamsSchema,
    body: takeSuggestionSchema,
    handle: async ({ services, actor, scheme, params, body }) => {
      const asked = { ...body, id: params.matterId };
      return answerWith(services, scheme, await takeSuggestion(services, actor, scheme, asked));
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/matters/:matterId/photographs/:matterPhotographId',
    access: { scheme: 'readMatters' },
    params: matterPhotographParamsSchema,
    handle: async ({ scheme, params, ...call }) => {
      const found = await findMatterPhotograph(call.services.database, scheme.id, params);
      if (found === undefined) throw new AppError('not-found');
      await sendPhotograph(call, found);
    },
  }),
];
