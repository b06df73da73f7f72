import type { ReferenceKey } from '../../../../shared/references.ts';
import type { MethodFormula } from './formula-parts.ts';

/** A formula that no working writes out, since the computing does it in one go. */
export function formula(
  symbol: string,
  expression: string,
  meaning: string,
  unit: string,
  reference: ReferenceKey,
): MethodFormula {
  return { symbol, expression, meaning, unit, reference };
}
