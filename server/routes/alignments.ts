import {
  alignmentParamsSchema,
  changeAlignmentSchema,
  copyAlignmentSchema,
  newAlignmentSchema,
} from '../../shared/schemas/alignments.ts';
import { changeAlignment } from '../commands/change-alignment.ts';
import { copyAlignment } from '../commands/copy-alignment.ts';
import { createAlignment } from '../commands/create-alignment.ts';
import { removeAlignment } from '../commands/remove-alignment.ts';
import { findAlignment, findAlignments } from '../models/find-alignments.ts';
import { presentAlignment } from '../presenters/alignment.ts';
import { defineRoute } from './define-route.ts';

export const alignmentRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/alignments',
    access: { scheme: 'readAlignments' },
    handle: async ({ scheme }) => (await findAlignments(scheme.id)).map(presentAlignment),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/alignments',
    access: { scheme: 'updateAlignments' },
    body: newAlignmentSchema,
    bodyLimit: '1mb',
    status: 201,
    handle: async ({ services, actor, scheme, body }) => {
      const { id } = await createAlignment(services, actor, scheme, body);
      return presentAlignment(await findAlignment(scheme.id, id));
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/alignments/:alignmentId',
    access: { scheme: 'readAlignments' },
    params: alignmentParamsSchema,
    handle: async ({ scheme, params }) =>
      presentAlignment(await findAlignment(scheme.id, params.alignmentId)),
  }),
  defineRoute({
    method: 'patch',
    path: '/api/schemes/:schemeId/alignments/:alignmentId',
    access: { scheme: 'updateAlignments' },
    params: alignmentParamsSchema,
    body: changeAlignmentSchema,
    bodyLimit: '1mb',
    handle: async ({ services, actor, scheme, params, body }) => {
      const id = params.alignmentId;
      await changeAlignment(services, actor, scheme, { id, ...body });
      return presentAlignment(await findAlignment(scheme.id, id));
    },
  }),
  defineRoute({
    method: 'delete',
    path: '/api/schemes/:schemeId/alignments/:alignmentId',
    access: { scheme: 'updateAlignments' },
    params: alignmentParamsSchema,
    handle: ({ services, actor, scheme, params }) =>
      removeAlignment(services, actor, scheme, params.alignmentId),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/alignments/:alignmentId/copies',
    access: { scheme: 'updateAlignments' },
    params: alignmentParamsSchema,
    body: copyAlignmentSchema,
    status: 201,
    handle: async ({ services, actor, scheme, params, body }) => {
      const given = { id: params.alignmentId, ...body };
      const { id } = await copyAlignment(services, actor, scheme, given);
      return presentAlignment(await findAlignment(scheme.id, id));
    },
  }),
];
