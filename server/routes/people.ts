import { z } from 'zod';
import {
  changePersonSchema,
  newPersonSchema,
  type InvitedAnswer,
  type PersonAnswer,
} from '../../shared/schemas/people.ts';
import { changePerson } from '../commands/change-person.ts';
import { invitePerson } from '../commands/invite-person.ts';
import { renewInvitation } from '../commands/renew-invitation.ts';
import { findPersonRecord, findPersonRecords } from '../models/find-person-records.ts';
import { presentPerson } from '../presenters/person.ts';
import { defineRoute } from './define-route.ts';

const personParams = z.object({ personId: z.uuid() });

async function personAnswer(personId: string): Promise<PersonAnswer> {
  return presentPerson(await findPersonRecord(personId));
}

async function invitedAnswer(personId: string, letterSent: boolean): Promise<InvitedAnswer> {
  return { person: await personAnswer(personId), letterSent };
}

export const peopleRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/people',
    access: 'administrator',
    handle: async () => (await findPersonRecords()).map(presentPerson),
  }),
  defineRoute({
    method: 'post',
    path: '/api/people',
    access: 'administrator',
    status: 201,
    body: newPersonSchema,
    handle: async ({ services, actor, body }) => {
      const { personId, letterSent } = await invitePerson(services, actor, body);
      return invitedAnswer(personId, letterSent);
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/people/:personId',
    access: 'administrator',
    params: personParams,
    handle: ({ params }) => personAnswer(params.personId),
  }),
  defineRoute({
    method: 'patch',
    path: '/api/people/:personId',
    access: 'administrator',
    params: personParams,
    body: changePersonSchema,
    handle: async ({ services, actor, params, body }) => {
      await changePerson(services, actor, params.personId, body);
      return personAnswer(params.personId);
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/people/:personId/invitations',
    access: 'administrator',
    status: 201,
    params: personParams,
    handle: async ({ services, actor, params }) => {
      const letterSent = await renewInvitation(services, actor, params.personId);
      return invitedAnswer(params.personId, letterSent);
    },
  }),
];
