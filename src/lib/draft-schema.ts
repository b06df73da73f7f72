import { z } from 'zod';

type Issue = z.core.$ZodIssue;

function ownWords({ message }: Issue): string {
  return message;
}

/**
 * A schema for what a form holds while it is being written: `finish` makes of it what `schema` checks,
 * and the faults stand at the same places.
 */
export function draftSchema<Draft, T>(
  schema: z.ZodType<T>,
  finish: (draft: Draft) => unknown,
  faultWords: (issue: Issue) => string = ownWords,
) {
  return z.custom<Draft>().transform((draft, context): T => {
    const parsed = schema.safeParse(finish(draft));
    if (parsed.success) return parsed.data;
    for (const issue of parsed.error.issues) {
      context.addIssue({ code: 'custom', path: [...issue.path], message: faultWords(issue) });
    }
    return z.NEVER;
  });
}
