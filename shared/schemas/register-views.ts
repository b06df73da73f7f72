import { z } from 'zod';
import {
  REGISTER_COLUMNS,
  registerColumnSchema,
  registerFilterSchema,
  registerSortSchema,
} from './register.ts';

/**
 * A view of the register that somebody keeps: which buildings, in which order, which columns.
 *
 * Units: none. Valid: a name of one line. Source: [own].
 */
export const newRegisterViewSchema = z.strictObject({
  name: z
    .string()
    .trim()
    .min(1, 'Give the view a name.')
    .max(80)
    .regex(/^\P{Cc}*$/u),
  filter: registerFilterSchema,
  sort: registerSortSchema,
  columns: z.array(registerColumnSchema).min(1).max(REGISTER_COLUMNS.length),
});

/**
 * A view of the register as its keeper sees it; a name that is used again replaces the older view.
 *
 * Units: none. Valid: own views only. Source: [own].
 */
export const registerViewSchema = newRegisterViewSchema.extend({ id: z.uuid() });

/**
 * A kept view of the register.
 *
 * Units: none. Valid: parsed by registerViewSchema. Source: [own].
 */
export type RegisterView = z.infer<typeof registerViewSchema>;

/**
 * The address of a kept view.
 *
 * Units: none. Valid: an own view of the scheme. Source: [own].
 */
export const registerViewParamsSchema = z.object({ schemeId: z.string(), viewId: z.uuid() });
