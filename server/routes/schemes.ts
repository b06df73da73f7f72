import { changeSchemeSchema } from '../../shared/schemas/schemes.ts';
import { changeScheme } from '../commands/change-scheme.ts';
import { presentScheme } from '../presenters/scheme.ts';
import { defineRoute } from './define-route.ts';

export const schemeRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId',
    access: { scheme: 'readScheme' },
    handle: ({ scheme, actor }) => presentScheme(scheme, actor),
  }),
  defineRoute({
    method: 'patch',
    path: '/api/schemes/:schemeId',
    access: { scheme: 'updateScheme' },
    body: changeSchemeSchema,
    handle: async ({ services, scheme, actor, body }) =>
      presentScheme(await changeScheme(services, actor, scheme, body), actor),
  }),
];
