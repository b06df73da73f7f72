import { pipeline } from 'node:stream/promises';
import { z } from 'zod';
import {
  changeImportSchema,
  confirmImportSchema,
  IMPORT_LIMITS,
  importParamsSchema,
  importRowsQuerySchema,
} from '../../shared/schemas/imports.ts';
import { importTileSchema } from '../../shared/schemas/tiles.ts';
import { cancelImport } from '../commands/cancel-import.ts';
import { changeImport } from '../commands/change-import.ts';
import { confirmImport } from '../commands/confirm-import.ts';
import { showMend } from '../commands/show-mend.ts';
import { startImport } from '../commands/start-import.ts';
import { importReport } from '../documents/import-report.ts';
import { receiveFileInto } from '../middleware/receive-file.ts';
import { findImport, findImports } from '../models/find-imports.ts';
import { findReportPage } from '../models/import-report.ts';
import { presentImport, presentListedImport } from '../presenters/import.ts';
import { importTile } from '../tiles/import-tile.ts';
import { answerTile } from './answer-tile.ts';
import { defineRoute } from './define-route.ts';

const importRowParamsSchema = importParamsSchema.extend({
  row: z.coerce.number().int().min(0).max(2_147_483_647),
});

export const importRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/imports',
    access: { scheme: 'readRegister' },
    handle: async ({ scheme }) =>
      (await findImports(scheme.id)).map(({ row, by }) => presentListedImport(row, by)),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/imports',
    access: { scheme: 'updateRegister' },
    status: 201,
    handle: async ({ services, actor, scheme, req, res }) => {
      const folder = services.env.UPLOADS_FOLDER;
      const sent = await receiveFileInto(folder, req, res, IMPORT_LIMITS.bytes);
      const { id } = await startImport(services, actor, scheme, sent);
      const { row, by } = await findImport(scheme.id, id);
      return presentImport(row, by);
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/imports/:importId',
    access: { scheme: 'readRegister' },
    params: importParamsSchema,
    handle: async ({ scheme, params }) => {
      const { row, by } = await findImport(scheme.id, params.importId);
      return presentImport(row, by);
    },
  }),
  defineRoute({
    method: 'patch',
    path: '/api/schemes/:schemeId/imports/:importId',
    access: { scheme: 'updateRegister' },
    params: importParamsSchema,
    body: changeImportSchema,
    bodyLimit: '1mb',
    handle: async ({ services, scheme, params, body }) => {
      const { row, by } = await findImport(scheme.id, params.importId);
      await changeImport(services, scheme, row, body);
      return presentImport(row, by);
    },
  }),
  defineRoute({
    method: 'delete',
    path: '/api/schemes/:schemeId/imports/:importId',
    access: { scheme: 'updateRegister' },
    params: importParamsSchema,
    handle: async ({ services, actor, scheme, params }) => {
      const { row, by } = await findImport(scheme.id, params.importId);
      await cancelImport(services, actor, row);
      return presentImport(row, by);
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/imports/:importId/confirm',
    access: { scheme: 'updateRegister' },
    params: importParamsSchema,
    body: confirmImportSchema,
    handle: async ({ services, actor, scheme, params, body }) => {
      const { row, by } = await findImport(scheme.id, params.importId);
      await confirmImport(services, actor, row, body.version);
      return presentImport(row, by);
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/imports/:importId/rows',
    access: { scheme: 'readRegister' },
    params: importParamsSchema,
    query: importRowsQuerySchema,
    handle: async ({ services, scheme, params, query }) => {
      const { row } = await findImport(scheme.id, params.importId);
      const { outcome = null, offset, limit } = query;
      return findReportPage(services.database, row.id, { outcome, offset, limit });
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/imports/:importId/rows/:row/mend',
    access: { scheme: 'readRegister' },
    params: importRowParamsSchema,
    handle: async ({ services, scheme, params }) => {
      const { row } = await findImport(scheme.id, params.importId);
      return showMend(services, scheme, row, params.row);
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/imports/:importId/report.csv',
    access: { scheme: 'readRegister' },
    params: importParamsSchema,
    handle: async ({ services, scheme, params, res }) => {
      const { row } = await findImport(scheme.id, params.importId);
      res.attachment('import-report.csv');
      res.type('text/csv; charset=utf-8');
      await pipeline(importReport(services.database, row.id), res);
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/tiles/imports/:importId/:version/:z/:x/:y.pbf',
    access: { scheme: 'readRegister' },
    params: importTileSchema,
    handle: async (call) => {
      const { row } = await findImport(call.scheme.id, call.params.importId);
      if (row.state === 'asking') {
        const kind = { name: `imports/${row.id}`, newest: row.version };
        await answerTile(call, {
          ...kind,
          make: (database, _, place) => importTile(database, row.id, place),
        });
        return;
      }
      // rows are being written or are gone: nothing to keep
      call.res.set('Cache-Control', 'no-store');
      call.res.status(204).end();
    },
  }),
];
