import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import type { AlignmentAnswer } from '../../../../shared/schemas/alignments.ts';
import { alignmentsQuery } from '../api/list-alignments.ts';

const NAME = 'option';
/** In the address where no option is to be seen. */
const NONE = 'none';

/** The option that the address names, or the first; and the way to name another, or none. */
export function useChosenOption(schemeId: string, canRead: boolean) {
  const [search, setSearch] = useSearchParams();
  const { data } = useQuery({ ...alignmentsQuery(schemeId), enabled: canRead });
  const named = search.get(NAME);
  const options: readonly AlignmentAnswer[] = data ?? [];
  const first = options[0] ?? null;
  const option = named === NONE ? null : (options.find(({ id }) => id === named) ?? first);
  return {
    options,
    isKnown: data !== undefined,
    option,
    choose: (alignmentId: string | null) => {
      setSearch(
        (now) => {
          const next = new URLSearchParams(now);
          next.set(NAME, alignmentId ?? NONE);
          return next;
        },
        { replace: true },
      );
    },
  };
}
