import {
  assignBuildingsSchema,
  checkDecisionSchema,
  checkDecisionsSchema,
  decisionParamsSchema,
  newDecisionsSchema,
  proposedDecisionSchema,
  waitingDecisionsSchema,
  withdrawDecisionsSchema,
} from '../../shared/schemas/decisions.ts';
import { runBuildingParamsSchema } from '../../shared/schemas/runs.ts';
import { assignBuildings } from '../commands/assign-buildings.ts';
import { checkDecision } from '../commands/check-decision.ts';
import { checkDecisions } from '../commands/check-decisions.ts';
import { prepareDecisions } from '../commands/prepare-decisions.ts';
import { withdrawDecisions } from '../commands/withdraw-decisions.ts';
import { buildingDecisions } from '../decisions/building-decisions.ts';
import { funnelOf } from '../decisions/funnel.ts';
import { previewDecisions } from '../decisions/preview-decisions.ts';
import { countWaiting, waitingForCheck } from '../decisions/waiting-for-check.ts';
import { findAssessors } from '../models/find-assessors.ts';
import { defineRoute } from './define-route.ts';

export const decisionRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/funnel',
    access: { scheme: 'readDecisions' },
    handle: ({ services, actor, scheme }) => funnelOf(services, actor, scheme),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/assessors',
    access: { scheme: 'readDecisions' },
    handle: ({ services, scheme }) => findAssessors(services.database, scheme.id),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/runs/:runId/buildings/:buildingId/decisions',
    access: { scheme: 'readDecisions' },
    params: runBuildingParamsSchema,
    handle: ({ services, actor, scheme, params }) =>
      buildingDecisions(services, actor, scheme, params),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/decisions',
    access: { scheme: 'prepareDecisions' },
    body: newDecisionsSchema,
    status: 201,
    handle: ({ services, actor, scheme, body }) => prepareDecisions(services, actor, scheme, body),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/decisions/preview',
    access: { scheme: 'prepareDecisions' },
    body: proposedDecisionSchema,
    handle: ({ services, scheme, body }) => previewDecisions(services, scheme, body),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/decisions/waiting',
    access: { scheme: 'checkDecisions' },
    body: waitingDecisionsSchema,
    handle: async ({ services: { database }, actor, scheme, body }) => {
      const { waiting } = await waitingForCheck(database, scheme.id, body.filter, null);
      return countWaiting(waiting, actor);
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/decisions/checks',
    access: { scheme: 'checkDecisions' },
    body: checkDecisionsSchema,
    handle: ({ services, actor, scheme, body }) => checkDecisions(services, actor, scheme, body),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/decisions/:decisionId/check',
    access: { scheme: 'checkDecisions' },
    params: decisionParamsSchema,
    body: checkDecisionSchema,
    handle: ({ services, actor, scheme, params, body }) =>
      checkDecision(services, actor, scheme, { id: params.decisionId, ...body }),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/decisions/withdrawals',
    access: { scheme: 'prepareDecisions' },
    body: withdrawDecisionsSchema,
    handle: ({ services, actor, scheme, body }) => withdrawDecisions(services, actor, scheme, body),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/assignments',
    access: { scheme: 'assignBuildings' },
    body: assignBuildingsSchema,
    handle: ({ services, actor, scheme, body }) => assignBuildings(services, actor, scheme, body),
  }),
];
