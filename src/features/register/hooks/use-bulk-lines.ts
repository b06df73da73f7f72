import { useQuery } from '@tanstack/react-query';
import type { BuildingAttributes } from '../../../../shared/schemas/building-fields.ts';
import type { RegisterFilter } from '../../../../shared/schemas/register.ts';
import { manyPreviewQuery } from '../../buildings/api/preview-many.ts';
import { fieldsSet, type BulkLine } from '../bulk-summary.ts';

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
  const { data, error } = useQuery(manyPreviewQuery(schemeId, { filter, attributes }));
  const lines = fieldsSet(attributes).flatMap((set) => {
    const counted = data?.find(({ field }) => field === set.field);
    return counted === undefined ? [] : [{ ...set, ...counted }];
  });
  return { lines: data === undefined ? undefined : lines, error };
}
