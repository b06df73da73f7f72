import {
  changePartySchema,
  erasePartySchema,
  mergePartiesSchema,
  partiesExportQuerySchema,
  partiesQuerySchema,
  partyFormQuerySchema,
  partyParamsSchema,
  partyValuesSchema,
} from '../../shared/schemas/parties.ts';
import { addParty } from '../commands/add-party.ts';
import { changeParty } from '../commands/change-party.ts';
import { eraseParty } from '../commands/erase-party.ts';
import { readParty } from '../commands/kept-party.ts';
import { mergeParties } from '../commands/merge-parties.ts';
import { sendParties } from '../exports/send-parties.ts';
import { sendPartyForm } from '../exports/send-party-form.ts';
import { findKeptUntil, findLikelySame, findParties, findPartiesById } from '../models/parties.ts';
import { findPartyChanges } from '../models/party-changes.ts';
import { personalData } from '../parties/personal-data.ts';
import {
  presentLikelySame,
  presentParties,
  presentParty,
  presentPartyDetail,
} from '../presenters/party.ts';
import { defineRoute } from './define-route.ts';

export const partyRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/parties',
    access: { scheme: 'readParties' },
    query: partiesQuerySchema,
    handle: async ({ services, scheme, query }) =>
      presentParties(await findParties(services.database, scheme.id, query)),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/parties/likely-same',
    access: { scheme: 'readParties' },
    handle: async ({ services: { database }, scheme }) => {
      const pairs = await findLikelySame(database, scheme.id);
      const ids = [...new Set(pairs.flatMap((pair) => pair.ids))];
      return presentLikelySame(pairs, await findPartiesById(database, scheme.id, ids));
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/parties/export',
    access: { scheme: 'readParties' },
    query: partiesExportQuerySchema,
    handle: (call) => sendParties(call),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/parties/form',
    access: { scheme: 'readParties' },
    query: partyFormQuerySchema,
    handle: (call) => sendPartyForm({ ...call, format: call.query.format }),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/parties',
    access: { scheme: 'updateParties' },
    body: partyValuesSchema,
    bodyLimit: '1mb',
    status: 201,
    handle: async ({ services, actor, scheme, body }) =>
      presentParty(await addParty(services, actor, scheme, body)),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/parties/:partyId',
    access: { scheme: 'readParties' },
    params: partyParamsSchema,
    handle: async ({ services: { database }, scheme, params }) => {
      const party = await readParty(database, scheme.id, params.partyId);
      const changes = await findPartyChanges(database, [party.id]);
      return presentPartyDetail(party, changes, await findKeptUntil(database, party.id));
    },
  }),
  defineRoute({
    method: 'put',
    path: '/api/schemes/:schemeId/parties/:partyId',
    access: { scheme: 'updateParties' },
    params: partyParamsSchema,
    body: changePartySchema,
    bodyLimit: '1mb',
    handle: async ({ services, actor, scheme, params, body }) =>
      presentParty(await changeParty(services, actor, scheme, { id: params.partyId, ...body })),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/parties/:partyId/merge',
    access: { scheme: 'updateParties' },
    params: partyParamsSchema,
    body: mergePartiesSchema,
    handle: async ({ services, actor, scheme, params, body: { version, other } }) => {
      const both = { stays: { id: params.partyId, version }, goes: other };
      return presentParty(await mergeParties(services, actor, scheme, both));
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/parties/:partyId/personal-data',
    access: { scheme: 'readParties' },
    params: partyParamsSchema,
    handle: async ({ services, actor, scheme, params, res }) => {
      const data = await personalData(services, actor, scheme, params.partyId);
      res.set('Cache-Control', 'no-store');
      res.attachment('personal-data.json').type('application/json');
      res.send(JSON.stringify(data, null, 2));
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/parties/:partyId/erase',
    access: { scheme: 'erasePersonalData' },
    params: partyParamsSchema,
    body: erasePartySchema,
    handle: async ({ services, actor, scheme, params, body }) =>
      presentParty(await eraseParty(services, actor, scheme, { id: params.partyId, ...body })),
  }),
];
