import { zodResolver } from '@hookform/resolvers/zod';
import type { Resolver } from 'react-hook-form';
import type { z } from 'zod';
import { rulesSchema, type RuleSet } from '../../../shared/schemas/rules.ts';
import { draftSchema } from '../../lib/draft-schema.ts';
import { rulesOf, type RulesDraft } from './rules-draft.ts';

/** The schema speaks in its own units, so what is out of range is said without them. */
function faultWords(issue: z.core.$ZodIssue): string {
  const { code, message } = issue;
  const isOwn = !message.startsWith('Too') && !message.startsWith('Invalid');
  if (isOwn) return message;
  if (code === 'invalid_type') return 'Give a figure, such as 12.5.';
  // the slope is what the n of "1 in n" divides
  if (issue.path.at(-1) === 'slope') return 'Give 1 or more.';
  if (code === 'too_small') {
    return issue.origin === 'array' ? 'Give at least one.' : 'This is too small.';
  }
  if (code === 'too_big') return 'This is too large.';
  return code === 'invalid_format' ? 'Give a day.' : message;
}

/** Checks rules while they are being written, by the schema that the server checks them by. */
export const checkDraft: Resolver<RulesDraft, unknown, RuleSet> = zodResolver(
  draftSchema(rulesSchema, rulesOf, faultWords),
);
