import { buildingParamsSchema } from '../../shared/schemas/buildings.ts';
import {
  newVisitSchema,
  photographParamsSchema,
  VISIT_LIMITS,
} from '../../shared/schemas/visits.ts';
import { keepPhotograph } from '../commands/keep-photograph.ts';
import { recordVisit } from '../commands/record-visit.ts';
import { AppError } from '../errors.ts';
import { receiveFile } from '../middleware/receive-file.ts';
import { findBuildingEverKept } from '../models/find-building.ts';
import { findPhotograph } from '../models/find-photograph.ts';
import { findVisitedBuildings, findVisits } from '../models/find-visits.ts';
import { VisitPhotographFile } from '../models/visit-photograph-file.ts';
import { sendPhotograph } from '../photographs/send-photograph.ts';
import {
  presentPhotographFile,
  presentVisit,
  presentVisitedBuilding,
} from '../presenters/visit.ts';
import { defineRoute } from './define-route.ts';

export const visitRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/visits',
    access: { scheme: 'readVisits' },
    handle: async ({ services, scheme }) =>
      (await findVisitedBuildings(services.database, scheme.id)).map(presentVisitedBuilding),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/buildings/:buildingId/visits',
    access: { scheme: 'readVisits' },
    params: buildingParamsSchema,
    handle: async ({ services, scheme, params }) => {
      const { id } = await findBuildingEverKept(scheme.id, params.buildingId);
      return (await findVisits(services.database, id)).map(presentVisit);
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/buildings/:buildingId/visits',
    access: { scheme: 'recordVisits' },
    params: buildingParamsSchema,
    body: newVisitSchema,
    bodyLimit: '1mb',
    handle: async ({ services, actor, scheme, params, body, res }) => {
      const { id } = await findBuildingEverKept(scheme.id, params.buildingId);
      const isNew = await recordVisit(services, actor, scheme, { ...body, buildingId: id });
      res.status(isNew ? 201 : 200);
      const visits = await findVisits(services.database, id, body.id);
      res.json(visits.map(presentVisit)[0]);
    },
  }),
  defineRoute({
    method: 'put',
    path: '/api/schemes/:schemeId/visits/:visitId/photographs/:photographId',
    access: { scheme: 'recordVisits' },
    params: photographParamsSchema,
    handle: async ({ services, actor, scheme, params, req, res }) => {
      const found = await findPhotograph(scheme.id, params);
      if (found.visit.visitedBy !== actor.id) throw new AppError('not-allowed');
      const sent = await receiveFile(req, res, VISIT_LIMITS.photographBytes);
      return presentPhotographFile(await keepPhotograph(services, scheme, found.photograph, sent));
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/visits/:visitId/photographs/:photographId',
    access: { scheme: 'readVisits' },
    params: photographParamsSchema,
    handle: async ({ scheme, params, ...call }) => {
      const { photograph } = await findPhotograph(scheme.id, params);
      const file = await VisitPhotographFile.findByPk(photograph.id);
      await sendPhotograph(call, { number: photograph.number, file });
    },
  }),
];
