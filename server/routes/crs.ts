import { crsParamsSchema, crsSearchSchema } from '../../shared/schemas/crs.ts';
import { findCrs } from '../crs/find-crs.ts';
import { searchCrs } from '../crs/search-crs.ts';
import { AppError } from '../errors.ts';
import { defineRoute } from './define-route.ts';

export const crsRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/crs',
    access: 'signed-in',
    query: crsSearchSchema,
    handle: ({ query }) => searchCrs(query.search),
  }),
  defineRoute({
    method: 'get',
    path: '/api/crs/:code',
    access: 'signed-in',
    params: crsParamsSchema,
    handle: async ({ params }) => {
      const found = await findCrs(params.code);
      if (found === undefined) throw new AppError('not-found');
      if ('fault' in found) throw new AppError('invalid-input', found.fault);
      return found.crs;
    },
  }),
];
