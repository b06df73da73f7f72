import { useSearchParams } from 'react-router-dom';
import { sheetQuerySchema } from '../../../../shared/schemas/runs.ts';

const NAME = 'samples';

/** The seed of the samples that the address asks for, null where it asks for none, and how to ask. */
export function useSeed(runId: string): {
  readonly seed: number | null;
  readonly draw: (seed: number) => void;
} {
  const [search, setSearch] = useSearchParams();
  const found = sheetQuerySchema.safeParse({ samples: search.get(NAME) ?? undefined });
  return {
    seed: found.data?.samples ?? null,
    draw: (seed) => {
      setSearch((now) => {
        const next = new URLSearchParams(now);
        // of another run the same seed draws something else
        next.set('run', runId);
        next.set(NAME, String(seed));
        return next;
      });
    },
  };
}
