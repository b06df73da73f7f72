import {
  PARTY_IMPORT_LIMITS,
  partyColumnsSchema,
  partyImportParamsSchema,
  partyImportRowsQuerySchema,
  partyImportRowsSchema,
  takeOverSchema,
} from '../../shared/schemas/party-imports.ts';
import {
  checkPartyImport,
  readPartyImport,
  startPartyImport,
} from '../commands/check-party-import.ts';
import { giveUpPartyImport } from '../commands/give-up-party-import.ts';
import { takeOverPartyImport } from '../commands/take-over-party-import.ts';
import { partyImportReport } from '../documents/party-import-report.ts';
import { receiveFileInto } from '../middleware/receive-file.ts';
import { findPartyImports, findPartyReport } from '../models/party-imports.ts';
import { presentPartyImport } from '../presenters/party-import.ts';
import { defineRoute } from './define-route.ts';

const ONE = '/api/schemes/:schemeId/party-imports/:partyImportId';

export const partyImportRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/party-imports',
    access: { scheme: 'readParties' },
    handle: async ({ services, scheme }) =>
      (await findPartyImports(services.database, scheme.id)).map(presentPartyImport),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/party-imports',
    access: { scheme: 'updateParties' },
    status: 201,
    handle: async ({ services, actor, scheme, req, res }) => {
      const folder = services.env.UPLOADS_FOLDER;
      const sent = await receiveFileInto(folder, req, res, PARTY_IMPORT_LIMITS.bytes);
      return presentPartyImport(await startPartyImport(services, actor, scheme, sent));
    },
  }),
  defineRoute({
    method: 'get',
    path: ONE,
    access: { scheme: 'readParties' },
    params: partyImportParamsSchema,
    handle: async ({ services, scheme, params }) =>
      presentPartyImport(await readPartyImport(services.database, scheme.id, params.partyImportId)),
  }),
  defineRoute({
    method: 'put',
    path: `${ONE}/columns`,
    access: { scheme: 'updateParties' },
    params: partyImportParamsSchema,
    body: partyColumnsSchema,
    handle: async ({ services, scheme, params, body }) =>
      presentPartyImport(
        await checkPartyImport(services, scheme, params.partyImportId, body.columns),
      ),
  }),
  defineRoute({
    method: 'post',
    path: `${ONE}/take-over`,
    access: { scheme: 'updateParties' },
    params: partyImportParamsSchema,
    body: takeOverSchema,
    handle: async ({ services, actor, scheme, params, body }) => {
      const asked = { id: params.partyImportId, counts: body.counts };
      return presentPartyImport(await takeOverPartyImport(services, actor, scheme, asked));
    },
  }),
  defineRoute({
    method: 'delete',
    path: ONE,
    access: { scheme: 'updateParties' },
    params: partyImportParamsSchema,
    handle: async ({ services, actor, scheme, params }) =>
      presentPartyImport(await giveUpPartyImport(services, actor, scheme, params.partyImportId)),
  }),
  defineRoute({
    method: 'get',
    path: `${ONE}/rows`,
    access: { scheme: 'readParties' },
    params: partyImportParamsSchema,
    query: partyImportRowsQuerySchema,
    handle: async ({ services: { database }, scheme, params, query: { only = null, offset } }) => {
      const { id } = await readPartyImport(database, scheme.id, params.partyImportId);
      const page = { only, offset, limit: PARTY_IMPORT_LIMITS.page };
      return partyImportRowsSchema.parse(await findPartyReport(database, id, page));
    },
  }),
  defineRoute({
    method: 'get',
    path: `${ONE}/report.csv`,
    access: { scheme: 'readParties' },
    params: partyImportParamsSchema,
    handle: async ({ services: { database }, scheme, params, res }) => {
      const { id } = await readPartyImport(database, scheme.id, params.partyImportId);
      const { rows } = await findPartyReport(database, id, { offset: 0, limit: null });
      res.set('Cache-Control', 'no-store');
      res.attachment('parties-report.csv').type('text/csv; charset=utf-8');
      res.send(partyImportReport(rows));
    },
  }),
];
