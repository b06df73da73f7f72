import { z } from 'zod';
import { passwordResetSchema, useLinkSchema } from '../../shared/schemas/links.ts';
import { beginSession } from '../authentication/begin-session.ts';
import { requestPasswordReset } from '../commands/request-password-reset.ts';
import { useLink } from '../commands/use-link.ts';
import { findOpenLink } from '../models/find-open-link.ts';
import { presentLink } from '../presenters/link.ts';
import { presentSession } from '../presenters/session.ts';
import { defineRoute } from './define-route.ts';

const linkParams = z.object({ token: z.string() });

export const linkRoutes = [
  defineRoute({
    method: 'post',
    path: '/api/password-resets',
    access: 'anyone',
    limit: 'letter',
    status: 202,
    body: passwordResetSchema,
    handle: ({ services, body }) => {
      // not waited for, so that neither answer nor time tells who is known
      requestPasswordReset(services, body.email).catch((error: unknown) => {
        services.logger.error({ err: error }, 'a password reset failed');
      });
      return {};
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/links/:token',
    access: 'anyone',
    limit: 'link',
    params: linkParams,
    handle: async ({ params }) => presentLink(await findOpenLink(params.token)),
  }),
  defineRoute({
    method: 'post',
    path: '/api/links/:token',
    access: 'anyone',
    limit: 'link',
    params: linkParams,
    body: useLinkSchema,
    handle: async ({ services, params, body, req, res }) => {
      await beginSession(req, await useLink(services, params.token, body.password));
      return presentSession(services, req, res);
    },
  }),
];
