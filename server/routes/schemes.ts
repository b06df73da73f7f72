import {
  archiveSchemeSchema,
  changeSchemeSchema,
  newSchemeSchema,
} from '../../shared/schemas/schemes.ts';
import { archiveScheme } from '../commands/archive-scheme.ts';
import { changeScheme } from '../commands/change-scheme.ts';
import { createScheme } from '../commands/create-scheme.ts';
import { presentScheme } from '../presenters/scheme.ts';
import { findSchemes } from '../models/find-schemes.ts';
import { defineRoute } from './define-route.ts';

export const schemeRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes',
    access: 'signed-in',
    handle: async ({ actor }) =>
      (await findSchemes(actor)).map((own) => presentScheme(own.scheme, own.actor)),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes',
    access: 'administrator',
    body: newSchemeSchema,
    status: 201,
    handle: async ({ services, actor, body }) =>
      presentScheme(await createScheme(services, actor, body), { ...actor, roles: new Set() }),
  }),
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
  defineRoute({
    method: 'put',
    path: '/api/schemes/:schemeId/archived',
    access: { scheme: 'archiveScheme' },
    body: archiveSchemeSchema,
    handle: async ({ services, scheme, actor, body }) =>
      presentScheme(await archiveScheme(services, actor, scheme, body), actor),
  }),
];
