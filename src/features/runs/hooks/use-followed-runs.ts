import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import { followRun } from '../api/follow-run.ts';
import { runsQuery } from '../api/list-runs.ts';
import { isActive } from '../run-states.ts';

const EVERY_TWO_SECONDS = 2000;
const NONE: readonly RunAnswer[] = [];

/**
 * The runs of a scheme, kept up to date while they are worked out. Of the newest one the server tells; others,
 * and one of which it cannot tell, are asked for.
 */
export function useFollowedRuns(schemeId: string, mayRead: boolean) {
  const client = useQueryClient();
  const [broken, setBroken] = useState<string | null>(null);
  const listed = useQuery({
    ...runsQuery(schemeId),
    enabled: mayRead,
    refetchInterval: ({ state }) => {
      const [told, ...others] = (state.data ?? NONE).filter(isActive);
      return (others.length > 0 || told?.id === broken) && told !== undefined && EVERY_TWO_SECONDS;
    },
  });
  const runs = listed.data ?? NONE;
  const followed = runs.find(isActive)?.id ?? null;

  useEffect(() => {
    if (followed === null) return undefined;
    const { queryKey } = runsQuery(schemeId);
    return followRun(schemeId, followed, {
      onProgress: (progress) => {
        client.setQueryData(queryKey, (now) =>
          now?.map((run) => (run.id === followed ? { ...run, ...progress } : run)),
        );
        // which one is shown, what each says in full, and the results in the register are others now
        if (isActive(progress)) return;
        void client.invalidateQueries({ queryKey });
        void client.invalidateQueries({ queryKey: ['schemes', schemeId, 'register'] });
      },
      onBroken: () => {
        setBroken(followed);
      },
    });
  }, [client, schemeId, followed]);

  return { runs, listed };
}
