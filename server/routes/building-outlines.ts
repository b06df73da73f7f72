import { outlineBoxSchema } from '../../shared/schemas/building-outlines.ts';
import { boxToLonLat } from '../crs/box-to-lon-lat.ts';
import { findCrs } from '../crs/find-crs.ts';
import { AppError } from '../errors.ts';
import { findOutlinesInBox } from '../models/find-outlines-in-box.ts';
import { presentBuildingOutline } from '../presenters/building-outline.ts';
import { defineRoute } from './define-route.ts';

export const buildingOutlineRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/building-outlines',
    access: { scheme: 'readRegister' },
    query: outlineBoxSchema,
    handle: async ({ services, scheme, query }) => {
      const system = await findCrs(scheme.crs);
      if (system === undefined || 'fault' in system) throw new AppError('internal');
      const box = boxToLonLat(system.crs.definition, query);
      // nothing can stand where the grid does not reach
      if (box === null) return [];
      const found = await findOutlinesInBox(services.database, scheme.id, box);
      return found.map(presentBuildingOutline);
    },
  }),
];
