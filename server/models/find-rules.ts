import { Person } from './person.ts';
import { SchemeRules } from './scheme-rules.ts';

export type RulesBy = { readonly rules: SchemeRules; readonly by: Person | undefined };

/** Every version of a scheme's rules with who made it, the newest first. */
export async function findRules(schemeId: string): Promise<RulesBy[]> {
  const versions = await SchemeRules.findAll({
    where: { schemeId },
    order: [['version', 'desc']],
  });
  const people = await Person.findAll({ where: { id: versions.map((one) => one.createdBy) } });
  return versions.map((rules) => ({ rules, by: people.find(({ id }) => id === rules.createdBy) }));
}
