import { memberParamsSchema, memberRolesSchema } from '../../shared/schemas/members.ts';
import { changeMemberRoles } from '../commands/change-member-roles.ts';
import { presentMember } from '../presenters/member.ts';
import { findMembers } from '../models/find-members.ts';
import { defineRoute } from './define-route.ts';

export const memberRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/members',
    access: { scheme: 'readMembers' },
    handle: async ({ scheme }) =>
      (await findMembers(scheme.id)).map(({ person, roles }) => presentMember(person, roles)),
  }),
  defineRoute({
    method: 'put',
    path: '/api/schemes/:schemeId/members/:personId',
    access: { scheme: 'manageMembers' },
    params: memberParamsSchema,
    body: memberRolesSchema,
    handle: async ({ services, actor, scheme, params: { personId }, body: { roles } }) => {
      const change = { personId, roles };
      return presentMember(await changeMemberRoles(services, actor, scheme, change), roles);
    },
  }),
];
