import { z } from 'zod';
import { letterExceptions } from './letter-exceptions.ts';
import { LETTER_LIMITS } from './letter-limits.ts';
import { LETTER_KINDS } from './letter-settings.ts';
import { letterPartSchema } from './letters.ts';
import { writtenText } from './written.ts';

const kind = z.enum(LETTER_KINDS);

const subject = writtenText(LETTER_LIMITS.subject)
  .min(1, 'Write a subject.')
  .regex(/^\P{Cc}*$/u, 'The subject is one line.');

/**
 * What a letter says, with marks.
 *
 * Units: none. Valid: unknown marks are refused when it is kept. Source: [own].
 */
export const letterWordsSchema = z.strictObject({
  subject,
  body: writtenText(LETTER_LIMITS.body).min(1, 'Write the letter.'),
});

/**
 * A new version of a template, on top of the one that was seen; 0 is the one that a scheme starts with.
 *
 * Units: none. Valid: an older version is refused, so are unknown marks. Source: [own].
 */
export const newTemplateSchema = letterWordsSchema.extend({ basedOn: z.number().int().min(0) });

/**
 * A template as it holds.
 *
 * Units: none. Valid: by and at null at version 0. Source: [own].
 */
export const templateSchema = z.strictObject({
  kind,
  version: z.number().int().min(0),
  subject: z.string(),
  body: z.string(),
  by: z.string().nullable(),
  at: z.iso.datetime().nullable(),
});

/**
 * A template as it holds.
 *
 * Units: none. Valid: parsed by templateSchema. Source: [own].
 */
export type Template = z.infer<typeof templateSchema>;

/**
 * The newest version of every template.
 *
 * Units: none. Valid: in the order of LETTER_KINDS. Source: [own].
 */
export const templatesSchema = z.array(templateSchema);

/**
 * The address of a template.
 *
 * Units: none. Valid: of LETTER_KINDS. Source: [own].
 */
export const templateParamsSchema = z.object({ schemeId: z.string(), letterKind: kind });

/**
 * A letter that is being written, to be looked at as a real party would read it; without one, as the first who
 * gets it. `leftOut` and `chosen` are those of a batch.
 *
 * Units: none. Valid: any text. Source: [own].
 */
export const templatePreviewSchema = letterWordsSchema.extend({
  ...letterExceptions,
  partyId: z.uuid().nullable(),
});

/**
 * A template as a party would read it, and whom it can be looked at with.
 *
 * Units: none. Valid: letter null where the rules name nobody yet, or where marks are wrong. Source: [own].
 */
export const previewedTemplateSchema = z.strictObject({
  faults: z.array(z.string()),
  parties: z.array(z.strictObject({ id: z.uuid(), name: z.string() })),
  letter: z
    .strictObject({ name: z.string(), subject: z.string(), parts: z.array(letterPartSchema) })
    .nullable(),
});

/**
 * A template as a party would read it.
 *
 * Units: none. Valid: parsed by previewedTemplateSchema. Source: [own].
 */
export type PreviewedTemplate = z.infer<typeof previewedTemplateSchema>;
