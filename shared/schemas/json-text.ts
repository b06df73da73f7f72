import { z } from 'zod';

/**
 * JSON in a query's text, then checked; what is left out takes the default.
 *
 * Units: none. Valid: text of 100,000 letters at most. Source: [own].
 */
export function jsonText<T>(schema: z.ZodType<T>, fallback: T): z.ZodType<T> {
  return z
    .string()
    .max(100_000)
    .optional()
    .transform((given, context): unknown => {
      if (given === undefined) return fallback;
      try {
        return JSON.parse(given);
      } catch {
        context.addIssue({ code: 'custom', message: 'This is not JSON.' });
        return z.NEVER;
      }
    })
    .pipe(schema);
}
