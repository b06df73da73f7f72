import { rulesSchema, type RulesVersion } from '../../shared/schemas/rules.ts';
import type { Person } from '../models/person.ts';
import type { SchemeRules } from '../models/scheme-rules.ts';

/** What leaves the server of a version of the rules; `by` is who made it. */
export function presentRulesVersion(
  { version, rules, createdAt, createdBy }: SchemeRules,
  by: Pick<Person, 'name'> | undefined,
): RulesVersion {
  return {
    version,
    rules: rulesSchema.parse(rules),
    createdAt: createdAt.toISOString(),
    createdBy: { id: createdBy, name: by?.name ?? '' },
  };
}
