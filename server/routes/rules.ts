import { newRulesSchema } from '../../shared/schemas/rules.ts';
import { addRules } from '../commands/add-rules.ts';
import { Person } from '../models/person.ts';
import { presentRulesVersion } from '../presenters/rules-version.ts';
import { findRules } from '../models/find-rules.ts';
import { defineRoute } from './define-route.ts';

export const rulesRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/rules',
    access: { scheme: 'readRules' },
    handle: async ({ scheme }) =>
      (await findRules(scheme.id)).map(({ rules, by }) => presentRulesVersion(rules, by)),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/rules',
    access: { scheme: 'updateRules' },
    body: newRulesSchema,
    status: 201,
    handle: async ({ services, actor, scheme, body }) => {
      const added = await addRules(services, actor, scheme, body);
      const by = await Person.findByPk(actor.id, { rejectOnEmpty: true });
      return presentRulesVersion(added, by);
    },
  }),
];
