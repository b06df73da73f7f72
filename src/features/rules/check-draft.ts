import { zodResolver } from '@hookform/resolvers/zod';
import type { Resolver } from 'react-hook-form';
import type { z } from 'zod';
import { rulesSchema, type RuleSet } from '../../../shared/schemas/rules.ts';
import { draftSchema } from '../../lib/draft-schema.ts';
import { rulesOf, type RulesDraft } from './rules-draft.ts';

/** The schema speaks in its own units, so what is out of range is said without them. */
function faultWords({ code, message }: z.core.$ZodIssue): string {
  switch (code) {
    case 'invalid_type':
      return 'Give a figure.';
    case 'too_small':
      return message.startsWith('Too') ? 'This is too small.' : message;
    case 'too_big':
      return message.startsWith('Too') ? 'This is too large.' : message;
    case 'invalid_format':
      return 'Give a day.';
    case 'custom':
    case 'invalid_element':
    case 'invalid_key':
    case 'invalid_union':
    case 'invalid_value':
    case 'not_multiple_of':
    case 'unrecognized_keys':
      return message;
  }
}

/** Checks rules while they are being written, by the schema that the server checks them by. */
export const checkDraft: Resolver<RulesDraft, unknown, RuleSet> = zodResolver(
  draftSchema(rulesSchema, rulesOf, faultWords),
);
