import { schemeQuery } from '../../schemes/api/get-scheme.ts';

/** Layouts or prints of a scheme are kept under it. */
export function evidenceKey(schemeId: string, part: 'layouts' | 'prints'): readonly string[] {
  return [...schemeQuery(schemeId).queryKey, part];
}
