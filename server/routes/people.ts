import { z } from 'zod';
import {
  changePersonSchema,
  newPersonSchema,
  shutOutSchema,
  type PersonAnswer,
} from '../../shared/schemas/people.ts';
import { changePerson } from '../commands/change-person.ts';
import { invitePerson } from '../commands/invite-person.ts';
import { renewInvitation } from '../commands/renew-invitation.ts';
import { shutOutPerson } from '../commands/shut-out-person.ts';
import { withdrawInvitation } from '../commands/withdraw-invitation.ts';
import { findPersonRecord, findPersonRecords } from '../models/find-person-records.ts';
import type { Actor } from '../policies/actor.ts';
import { presentPerson } from '../presenters/person.ts';
import { defineRoute } from './define-route.ts';

const personParams = z.object({ personId: z.uuid() });

async function personAnswer(actor: Actor, personId: string): Promise<PersonAnswer> {
  return presentPerson(await findPersonRecord(personId), actor);
}

export const peopleRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/people',
    access: 'administrator',
    handle: async ({ actor }) =>
      (await findPersonRecords()).map((record) => presentPerson(record, actor)),
  }),
  defineRoute({
    method: 'post',
    path: '/api/people',
    access: 'administrator',
    status: 201,
    body: newPersonSchema,
    handle: async ({ services, actor, body }) => {
      return personAnswer(actor, await invitePerson(services, actor, body));
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/people/:personId',
    access: 'administrator',
    params: personParams,
    handle: ({ actor, params }) => personAnswer(actor, params.personId),
  }),
  defineRoute({
    method: 'patch',
    path: '/api/people/:personId',
    access: 'administrator',
    params: personParams,
    body: changePersonSchema,
    handle: async ({ services, actor, params, body }) => {
      await changePerson(services, actor, params.personId, body);
      return personAnswer(actor, params.personId);
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/people/:personId/invitations',
    access: 'administrator',
    status: 201,
    params: personParams,
    handle: async ({ services, actor, params }) => {
      await renewInvitation(services, actor, params.personId);
      return personAnswer(actor, params.personId);
    },
  }),
  defineRoute({
    method: 'delete',
    path: '/api/people/:personId/invitations',
    access: 'administrator',
    params: personParams,
    handle: async ({ services, actor, params }) => {
      await withdrawInvitation(services, actor, params.personId);
      return personAnswer(actor, params.personId);
    },
  }),
  defineRoute({
    method: 'put',
    path: '/api/people/:personId/shut-out',
    access: 'administrator',
    params: personParams,
    body: shutOutSchema,
    handle: async ({ services, actor, params, body }) => {
      await shutOutPerson(services, actor, params.personId, body.shutOut);
      return personAnswer(actor, params.personId);
    },
  }),
];
