import { crsParamsSchema, crsPurposeSchema, crsSearchSchema } from '../../shared/schemas/crs.ts';
import { findFileCrs } from '../crs/file-crs.ts';
import { findCrsForScheme } from '../crs/find-crs.ts';
import { searchCrs } from '../crs/search-crs.ts';
import { AppError } from '../errors.ts';
import { defineRoute } from './define-route.ts';

export const crsRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/crs',
    access: 'signed-in',
    query: crsSearchSchema,
    handle: ({ query }) => searchCrs(query.search, query.for),
  }),
  defineRoute({
    method: 'get',
    path: '/api/crs/:code',
    access: 'signed-in',
    params: crsParamsSchema,
    query: crsPurposeSchema,
    handle: async ({ params, query }) => {
      const find = query.for === 'file' ? findFileCrs : findCrsForScheme;
      const found = await find(params.code);
      if (found === undefined) throw new AppError('not-found');
      if ('fault' in found) throw new AppError('invalid-input', found.fault);
      const { code, name, area, definition, bounds } = found.crs;
      return { code, name, area, definition, bounds };
    },
  }),
];
