import {
  changeLayoutSchema,
  layoutParamsSchema,
  newLayoutSchema,
  newPrintSchema,
  printParamsSchema,
} from '../../shared/schemas/evidence.ts';
import {
  aboutSheetsSchema,
  materialBoxSchema,
  planMaterialSchema,
} from '../../shared/schemas/evidence-material.ts';
import { runParamsSchema } from '../../shared/schemas/runs.ts';
import { askPrint } from '../commands/ask-print.ts';
import { cancelPrint } from '../commands/cancel-print.ts';
import { changeLayout } from '../commands/change-layout.ts';
import { createLayout } from '../commands/create-layout.ts';
import { keptPrint } from '../commands/kept-print.ts';
import { removeLayout } from '../commands/remove-layout.ts';
import { aboutRun } from '../evidence/about-run.ts';
import { openMaterial } from '../evidence/open-material.ts';
import { sendPrint } from '../evidence/send-print.ts';
import { findLayouts } from '../models/plan-layouts.ts';
import { findPrints } from '../models/prints.ts';
import { Run } from '../models/run.ts';
import { presentLayout, presentPrint } from '../presenters/evidence.ts';
import { findCompleteRun } from '../runs/find-complete-run.ts';
import { defineRoute } from './define-route.ts';

export const evidenceRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/layouts',
    access: { scheme: 'readEvidence' },
    handle: async ({ services, scheme }) =>
      (await findLayouts(services.database, scheme.id)).map(presentLayout),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/layouts',
    access: { scheme: 'prepareEvidence' },
    body: newLayoutSchema,
    status: 201,
    handle: async ({ services, actor, scheme, body }) =>
      presentLayout(await createLayout(services, actor, scheme, body)),
  }),
  defineRoute({
    method: 'patch',
    path: '/api/schemes/:schemeId/layouts/:layoutId',
    access: { scheme: 'prepareEvidence' },
    params: layoutParamsSchema,
    body: changeLayoutSchema,
    handle: async ({ services, actor, scheme, params, body }) =>
      presentLayout(await changeLayout(services, actor, scheme, { id: params.layoutId, ...body })),
  }),
  defineRoute({
    method: 'delete',
    path: '/api/schemes/:schemeId/layouts/:layoutId',
    access: { scheme: 'prepareEvidence' },
    params: layoutParamsSchema,
    handle: ({ services, actor, scheme, params }) =>
      removeLayout(services, actor, scheme, params.layoutId),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/runs/:runId/evidence',
    access: { scheme: 'readEvidence' },
    params: runParamsSchema,
    query: materialBoxSchema,
    handle: async ({ services: { database }, scheme, params, query }) => {
      const { id } = await findCompleteRun(database, scheme.id, params.runId);
      const run = await Run.findByPk(id, { rejectOnEmpty: true });
      const materialIn = await openMaterial(database, scheme, run);
      return planMaterialSchema.parse({ material: await materialIn(query) });
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/runs/:runId/evidence/about',
    access: { scheme: 'readEvidence' },
    params: runParamsSchema,
    handle: async ({ services, scheme, params }) =>
      aboutSheetsSchema.parse(await aboutRun(services, scheme, params.runId)),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/runs/:runId/prints',
    access: { scheme: 'prepareEvidence' },
    params: runParamsSchema,
    body: newPrintSchema,
    status: 201,
    handle: async ({ services, actor, scheme, params, body }) => {
      const id = await askPrint(services, actor, scheme, { runId: params.runId, ...body });
      return presentPrint(await keptPrint(services.database, scheme.id, id));
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/prints',
    access: { scheme: 'readEvidence' },
    handle: async ({ services, scheme }) =>
      (await findPrints(services.database, scheme.id)).map(presentPrint),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/prints/:printId',
    access: { scheme: 'readEvidence' },
    params: printParamsSchema,
    handle: async ({ services, scheme, params }) =>
      presentPrint(await keptPrint(services.database, scheme.id, params.printId)),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/prints/:printId/cancel',
    access: { scheme: 'prepareEvidence' },
    params: printParamsSchema,
    handle: async ({ services, actor, scheme, params }) => {
      await cancelPrint(services, actor, scheme, params.printId);
      return presentPrint(await keptPrint(services.database, scheme.id, params.printId));
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/prints/:printId/file',
    access: { scheme: 'readEvidence' },
    params: printParamsSchema,
    handle: async ({ services, scheme, params, res }) => {
      const print = await keptPrint(services.database, scheme.id, params.printId);
      await sendPrint(res, services.env, print);
    },
  }),
];
