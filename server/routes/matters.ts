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
import type { Actor } from '../policies/actor.ts';
import { isHiddenFrom } from '../policies/is-hidden-from.ts';
import { sendPhotograph } from '../photographs/send-photograph.ts';
import { presentMatter, presentMatterLine } from '../presenters/matter.ts';
import type { Services } from '../services.ts';
import { defineRoute } from './define-route.ts';

type Asked = { readonly services: Services; readonly scheme: Scheme; readonly actor: Actor };

async function answerWith({ services, scheme, actor }: Asked, matter: FoundMatter) {
  return presentMatter(matter, await findAssessors(services.database, scheme.id), actor);
}

export const matterRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/matters',
    access: { scheme: 'readMatters' },
    query: mattersQuerySchema,
    handle: async ({ services: { database }, actor, scheme, query }) => {
      const [matters, assessors] = await Promise.all([
        findMatters(database, scheme.id, query, actor),
        findAssessors(database, scheme.id),
      ]);
      const total = matters[0]?.total ?? 0;
      const lines = matters.map((matter) => presentMatterLine(matter, actor));
      return { total, matters: lines, assessors };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/matters/:matterId',
    access: { scheme: 'readMatters' },
    params: matterParamsSchema,
    handle: async ({ services, actor, scheme, params }) => {
      const found = await readMatter(services.database, scheme.id, { id: params.matterId });
      return answerWith({ services, scheme, actor }, found);
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
      res.status(isNew ? 201 : 200).json(await answerWith({ services, scheme, actor }, matter));
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
      const changed = await changeMatter(services, actor, scheme, asked);
      return answerWith({ services, scheme, actor }, changed);
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
      const taken = await takeSuggestion(services, actor, scheme, asked);
      return answerWith({ services, scheme, actor }, taken);
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/matters/:matterId/photographs/:matterPhotographId',
    access: { scheme: 'readMatters' },
    params: matterPhotographParamsSchema,
    handle: async ({ actor, scheme, params, ...call }) => {
      const found = await findMatterPhotograph(call.services.database, scheme.id, params);
      if (found === undefined || isHiddenFrom(actor, found.isErased)) {
        throw new AppError('not-found');
      }
      await sendPhotograph(call, found);
    },
  }),
];
