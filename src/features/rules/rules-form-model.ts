import type { UseFormReturn } from 'react-hook-form';
import type { RuleSet } from '../../../shared/schemas/rules.ts';
import type { RulesDraft } from './rules-draft.ts';

/** The form of the rules, as its parts are handed it. */
export type RulesFormModel = UseFormReturn<RulesDraft, unknown, RuleSet>;
