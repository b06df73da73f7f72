import { buildingParamsSchema, buildingSearchSchema } from '../../shared/schemas/buildings.ts';
import { findCrs } from '../crs/find-crs.ts';
import { AppError } from '../errors.ts';
import { Building } from '../models/building.ts';
import { presentBuilding, presentFoundBuilding } from '../presenters/building.ts';
import { presentExtent } from '../presenters/extent.ts';
import { findExtent } from '../models/find-extent.ts';
import { searchBuildings } from '../models/search-buildings.ts';
import { defineRoute } from './define-route.ts';

export const buildingRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/buildings',
    access: { scheme: 'readRegister' },
    query: buildingSearchSchema,
    handle: async ({ services, scheme, query }) =>
      (await searchBuildings(services.database, scheme.id, query)).map(presentFoundBuilding),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/buildings/:buildingId',
    access: { scheme: 'readRegister' },
    params: buildingParamsSchema,
    handle: async ({ scheme, params }) => {
      const building = await Building.findOne({
        where: { id: params.buildingId, schemeId: scheme.id },
      });
      if (building === null) throw new AppError('not-found');
      return presentBuilding(building);
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/extent',
    access: { scheme: 'readRegister' },
    handle: async ({ services, scheme }) =>
      presentExtent(
        scheme,
        await findExtent(services.database, scheme.id),
        await findCrs(scheme.crs),
      ),
  }),
];
