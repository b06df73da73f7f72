import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { RegisterFilter } from '../../../../shared/schemas/register.ts';
import { useSchemePlan } from '../../plan/hooks/use-scheme-plan.ts';
import { registerIdsQuery } from '../api/get-ids.ts';

/** The scheme's map on which the buildings that the filter leaves out are faint. */
export function useRegisterPlan(schemeId: string, filter: RegisterFilter, isShown: boolean) {
  const { ready, ...rest } = useSchemePlan();
  const isFiltered = JSON.stringify(filter) !== '{}';
  const { data } = useQuery({
    ...registerIdsQuery(schemeId, filter),
    enabled: isShown && isFiltered,
    placeholderData: keepPreviousData,
  });
  const ids = isFiltered ? data?.ids : undefined;
  const withMeant = useMemo(() => {
    if (ready === null || ids === undefined) return ready;
    return { ...ready, plan: { ...ready.plan, meant: new Set(ids) } };
  }, [ready, ids]);
  return { ...rest, ready: withMeant };
}
