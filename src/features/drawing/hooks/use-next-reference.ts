import { useQuery } from '@tanstack/react-query';
import { registerPageQuery } from '../../register/api/get-page.ts';
import { nextReference } from '../drafts/next-reference.ts';

const LAST = { filter: {}, sort: { column: 'reference', descending: true } } as const;

/** The reference after the last of the register; null until it is known. */
export function useNextReference(schemeId: string): string | null {
  const { data, isError } = useQuery(registerPageQuery(schemeId, LAST, 0, 1));
  if (isError) return '';
  return data === undefined ? null : nextReference(data.rows[0]?.reference);
}
