import { useQuery } from '@tanstack/react-query';
import type { RuleSet } from '../../../../shared/schemas/rules.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { rulesQuery } from '../api/list-rules.ts';

/** The scheme's reasons for scores; undefined until they are there, and for who may not read the rules. */
export function useSensitivityReasons(): RuleSet['sensitivity']['value'] | undefined {
  const scheme = useScheme();
  const mayRead = can(scheme, 'readRules');
  const { data } = useQuery({ ...rulesQuery(scheme.id), enabled: mayRead });
  return mayRead ? data?.[0]?.rules.sensitivity.value : undefined;
}
