import type { z } from 'zod';
import type { LetterKind } from '../../shared/schemas/letter-settings.ts';
import type { newTemplateSchema } from '../../shared/schemas/letter-templates.ts';
import { AppError } from '../errors.ts';
import { refuseBadMarks } from '../letters/refuse-bad-marks.ts';
import { heldTemplate, insertTemplate, type HeldTemplate } from '../models/letter-templates.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

type NewTemplate = z.infer<typeof newTemplateSchema> & { readonly kind: LetterKind };

/** Adds the next version of a template, unless somebody else has added one since it was begun. */
export async function addLetterTemplate(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  template: NewTemplate,
): Promise<HeldTemplate> {
  const { kind, basedOn, subject, body } = template;
  refuseBadMarks(template);
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const held = await heldTemplate(database, scheme.id, kind, transaction);
    if (held.version !== basedOn) throw new AppError('conflict');
    const row = { schemeId: scheme.id, kind, version: basedOn + 1, subject, body, by: by.id };
    await insertTemplate(database, row, transaction);
    const before = { subject: held.subject, body: held.body };
    const change = { by, schemeId: scheme.id, action: 'change template' };
    await recordChange(
      { ...change, subject: { kind: 'template', id: kind }, before, after: { subject, body } },
      transaction,
    );
    return heldTemplate(database, scheme.id, kind, transaction);
  });
}
