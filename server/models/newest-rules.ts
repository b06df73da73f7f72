import type { Transaction } from 'sequelize';
import { rulesSchema, type RuleSet } from '../../shared/schemas/rules.ts';
import { SchemeRules } from './scheme-rules.ts';

/** The newest rules of a scheme. */
export async function newestRules(
  schemeId: string,
  transaction: Transaction | null,
): Promise<{ readonly version: number; readonly rules: RuleSet }> {
  const newest = await SchemeRules.findOne({
    where: { schemeId },
    order: [['version', 'desc']],
    transaction,
    rejectOnEmpty: true,
  });
  return { version: newest.version, rules: rulesSchema.parse(newest.rules) };
}
