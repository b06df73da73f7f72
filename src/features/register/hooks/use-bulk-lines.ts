import { useQueries } from '@tanstack/react-query';
import type { BuildingAttributes } from '../../../../shared/schemas/building-fields.ts';
import { REGISTER_ORDER, type RegisterFilter } from '../../../../shared/schemas/register.ts';
import { registerPageQuery } from '../api/get-page.ts';
import { fieldsSet, havingValue, type BulkLine } from '../bulk-summary.ts';

const ONE_ROW = 1;

type Counted = {
  /** Undefined until all is counted. */
  readonly lines: readonly BulkLine[] | undefined;
  readonly error: Error | null;
};

/** Counts what the buildings that are to be changed have now. */
export function useBulkLines(
  schemeId: string,
  filter: RegisterFilter,
  attributes: BuildingAttributes,
): Counted {
  const set = fieldsSet(attributes);
  const wanted = set.flatMap(({ field, value }) => [
    havingValue(filter, field, value),
    havingValue(filter, field, null),
  ]);
  const counts = useQueries({
    queries: wanted.map((narrowed) => ({
      ...registerPageQuery(
        schemeId,
        { filter: narrowed ?? filter, sort: REGISTER_ORDER },
        0,
        ONE_ROW,
      ),
      enabled: narrowed !== null,
    })),
  });
  const found = wanted.map((narrowed, index) =>
    narrowed === null ? 0 : counts[index]?.data?.found,
  );
  const isCounted = !found.includes(undefined);
  return {
    lines: isCounted
      ? set.map((one, index) => ({
          ...one,
          same: found[2 * index] ?? 0,
          unknown: found[2 * index + 1] ?? 0,
        }))
      : undefined,
    error: counts.find(({ error }) => error !== null)?.error ?? null,
  };
}
