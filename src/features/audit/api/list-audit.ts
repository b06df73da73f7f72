import { infiniteQueryOptions, type InfiniteData } from '@tanstack/react-query';
import { auditPageSchema, type AuditPageAnswer } from '../../../../shared/schemas/audit.ts';
import { apiGet } from '../../../lib/api-client.ts';

/** The audit trail, page by page from the newest; of one scheme where it is given. */
export function auditQuery(schemeId: string) {
  return infiniteQueryOptions<
    AuditPageAnswer,
    Error,
    InfiniteData<AuditPageAnswer>,
    readonly string[],
    string | null
  >({
    queryKey: ['audit', schemeId],
    initialPageParam: null,
    getNextPageParam: ({ next }) => next,
    queryFn: ({ signal, pageParam }) => {
      const query = new URLSearchParams();
      if (pageParam !== null) query.set('before', pageParam);
      if (schemeId !== '') query.set('schemeId', schemeId);
      return apiGet(`/api/audit?${query.toString()}`, auditPageSchema, signal);
    },
    // the trail grows with every change, and there is no telling by which
    staleTime: 0,
  });
}
