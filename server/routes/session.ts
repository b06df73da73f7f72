import { changePasswordSchema, signInSchema } from '../../shared/schemas/session.ts';
import { beginSession } from '../authentication/begin-session.ts';
import { checkCredentials } from '../authentication/check-credentials.ts';
import { endSession } from '../authentication/end-session.ts';
import { changeOwnPassword } from '../commands/change-own-password.ts';
import { endSessions } from '../commands/end-sessions.ts';
import { presentSession } from '../presenters/session.ts';
import { defineRoute } from './define-route.ts';

/** Each answers with the session as it is then: its CSRF token is another one than before. */
export const sessionRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/session',
    access: 'anyone',
    handle: ({ services, req, res }) => presentSession(services, req, res),
  }),
  defineRoute({
    method: 'post',
    path: '/api/session',
    access: 'anyone',
    limit: 'sign-in',
    body: signInSchema,
    handle: async ({ services, req, res }) => {
      await beginSession(req, await checkCredentials(req, res));
      return presentSession(services, req, res);
    },
  }),
  defineRoute({
    method: 'delete',
    path: '/api/session',
    access: 'signed-in',
    handle: async ({ services, req, res }) => {
      await endSession(req);
      return presentSession(services, req, res);
    },
  }),
  defineRoute({
    method: 'delete',
    path: '/api/sessions',
    access: 'signed-in',
    handle: async ({ services, actor, req, res }) => {
      await endSessions(services, actor);
      await endSession(req);
      return presentSession(services, req, res);
    },
  }),
  defineRoute({
    method: 'put',
    path: '/api/session/password',
    access: 'signed-in',
    limit: 'own-password',
    body: changePasswordSchema,
    handle: async ({ services, actor, body, req, res }) => {
      await beginSession(req, await changeOwnPassword(services, actor, body));
      return presentSession(services, req, res);
    },
  }),
];
