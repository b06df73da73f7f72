import { newLetterSettingsSchema } from '../../shared/schemas/letter-settings.ts';
import {
  newTemplateSchema,
  templateParamsSchema,
  templatePreviewSchema,
} from '../../shared/schemas/letter-templates.ts';
import { addLetterSettings } from '../commands/add-letter-settings.ts';
import { addLetterTemplate } from '../commands/add-letter-template.ts';
import { previewTemplate } from '../letters/preview-template.ts';
import { heldSettings } from '../models/letter-settings.ts';
import { heldTemplates } from '../models/letter-templates.ts';
import { presentLetterSettings, presentTemplate } from '../presenters/letters.ts';
import { defineRoute } from './define-route.ts';

export const letterTemplateRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/letter-settings',
    access: { scheme: 'readLetters' },
    handle: async ({ services, scheme }) =>
      presentLetterSettings(await heldSettings(services.database, scheme)),
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/letter-settings',
    access: { scheme: 'updateLetterTemplates' },
    body: newLetterSettingsSchema,
    status: 201,
    handle: async ({ services, actor, scheme, body }) =>
      presentLetterSettings(await addLetterSettings(services, actor, scheme, body)),
  }),
  defineRoute({
    method: 'get',
    path: '/api/schemes/:schemeId/letter-templates',
    access: { scheme: 'readLetters' },
    handle: async ({ services, scheme }) =>
      (await heldTemplates(services.database, scheme.id)).map(presentTemplate),
  }),
  defineRoute({
    method: 'put',
    path: '/api/schemes/:schemeId/letter-templates/:letterKind',
    access: { scheme: 'updateLetterTemplates' },
    params: templateParamsSchema,
    body: newTemplateSchema,
    handle: async ({ services, actor, scheme, params, body }) => {
      const template = { ...body, kind: params.letterKind };
      return presentTemplate(await addLetterTemplate(services, actor, scheme, template));
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/schemes/:schemeId/letter-templates/:letterKind/preview',
    access: { scheme: 'readLetters' },
    params: templateParamsSchema,
    body: templatePreviewSchema,
    bodyLimit: '1mb',
    handle: ({ services, scheme, params, body }) =>
      previewTemplate(services, scheme, { ...body, kind: params.letterKind }),
  }),
];
