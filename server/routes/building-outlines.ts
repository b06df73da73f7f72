import { outlineBoxSchema } from '../../shared/schemas/building-outlines.ts';
import { boxToLonLat } from '../crs/box-to-lon-lat.ts';
import { crsOfScheme } from '../crs/crs-of-scheme.ts';
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
      const { definition } = await crsOfScheme(scheme);
      const box = boxToLonLat(definition, query);
      // nothing can stand where the grid does not reach
      if (box === null) return [];
      const found = await findOutlinesInBox(services.database, scheme.id, box);
      return found.map(presentBuildingOutline);
    },
  }),
];
