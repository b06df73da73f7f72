import { buildingParamsSchema, buildingSearchSchema } from '../../shared/schemas/buildings.ts';
import { findCrs } from '../crs/find-crs.ts';
import { findBuilding } from '../models/find-building.ts';
import { presentBuilding, presentFoundBuilding } from '../presenters/building.ts';
import { presentExtent } from '../presenters/extent.ts';
import { findExtent } from '../models/find-extent.ts';
import { findHome } from '../models/find-home.ts';
import { findFootprints } from '../models/footprints.ts';
import { findNeighbours } from '../models/find-neighbours.ts';
import { buildingWalls } from '../register/building-walls.ts';
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
    handle: async ({ services, scheme, params }) => {
      const { database } = services;
      const building = await findBuilding(scheme.id, params.buildingId);
      const { id } = building;
      const footprint = (await findFootprints(database, [id])).get(id) ?? [];
      const neighbours = await findNeighbours(database, building);
      return presentBuilding(building, footprint, buildingWalls(id, footprint, neighbours));
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/extent',
    access: { scheme: 'readRegister' },
    handle: async ({ services: { database }, scheme }) => {
      const extent = await findExtent(database, scheme.id);
      const drawn = extent && { ...extent, home: await findHome(database, scheme.id, extent) };
      return presentExtent(scheme, drawn, await findCrs(scheme.crs));
    },
  }),
];
