import { runExportQuerySchema } from '../../shared/schemas/run-export.ts';
import {
  newRunSchema,
  runBuildingParamsSchema,
  runParamsSchema,
  sheetQuerySchema,
} from '../../shared/schemas/runs.ts';
import { cancelRun } from '../commands/cancel-run.ts';
import { resumeRun } from '../commands/resume-run.ts';
import { startRun } from '../commands/start-run.ts';
import { sendSheet } from '../documents/sheet/send-sheet.ts';
import { sendRun } from '../exports/send-run.ts';
import { findRun, findRuns } from '../models/find-runs.ts';
import { findContours } from '../models/run-contours.ts';
import { findMapText } from '../models/run-results.ts';
import { presentRun } from '../presenters/run.ts';
import { runBuilding, runBuildingCase } from '../runs/run-building.ts';
import { runDetail } from '../runs/run-detail.ts';
import { answerRunPart } from './answer-run-part.ts';
import { defineRoute } from './define-route.ts';
import { followRun } from './follow-run.ts';

export const runRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/runs',
    access: { scheme: 'readRuns' },
    handle: async ({ services, scheme }) =>
      (await findRuns(services.database, scheme.id)).map(presentRun),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/runs',
    access: { scheme: 'startRuns' },
    body: newRunSchema,
    status: 201,
    handle: async ({ services, actor, scheme, body }) => {
      const { id } = await startRun(services, actor, scheme, body);
      return presentRun(await findRun(services.database, scheme.id, id));
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/runs/:runId',
    access: { scheme: 'readRuns' },
    params: runParamsSchema,
    handle: ({ services, scheme, params }) => runDetail(services, scheme.id, params.runId),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/runs/:runId/progress',
    access: { scheme: 'readRuns' },
    params: runParamsSchema,
    handle: async ({ services, scheme, params, res }) => {
      const { id } = await findRun(services.database, scheme.id, params.runId);
      await followRun(services.database, id, res);
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/runs/:runId/cancel',
    access: { scheme: 'startRuns' },
    params: runParamsSchema,
    handle: async ({ services, actor, scheme, params }) => {
      await cancelRun(services, actor, scheme, params.runId);
      return presentRun(await findRun(services.database, scheme.id, params.runId));
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/runs/:runId/resume',
    access: { scheme: 'startRuns' },
    params: runParamsSchema,
    handle: async ({ services, actor, scheme, params }) => {
      await resumeRun(services, actor, scheme, params.runId);
      return presentRun(await findRun(services.database, scheme.id, params.runId));
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/runs/:runId/map',
    access: { scheme: 'readRuns' },
    params: runParamsSchema,
    handle: (call) => answerRunPart(call, 'map', findMapText),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/runs/:runId/contours',
    access: { scheme: 'readRuns' },
    params: runParamsSchema,
    handle: (call) => answerRunPart(call, 'contours', findContours),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/runs/:runId/export',
    access: { scheme: 'readRuns' },
    params: runParamsSchema,
    query: runExportQuerySchema,
    handle: (call) => sendRun(call),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/runs/:runId/buildings/:buildingId',
    access: { scheme: 'readRuns' },
    params: runBuildingParamsSchema,
    handle: ({ services, scheme, params }) => runBuilding(services, scheme.id, params),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/runs/:runId/buildings/:buildingId/sheet.pdf',
    access: { scheme: 'readRuns' },
    params: runBuildingParamsSchema,
    query: sheetQuerySchema,
    handle: (call) => sendSheet(call, call.params, call.query.samples ?? null),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/runs/:runId/buildings/:buildingId/case',
    access: { scheme: 'readRuns' },
    params: runBuildingParamsSchema,
    handle: async ({ services, scheme, params, res }) => {
      const found = await runBuildingCase(services, scheme.id, params);
      res.attachment(`case-of-building-${params.buildingId}.json`);
      return found;
    },
  }),
];
