import { schemeQuery } from '../../schemes/api/get-scheme.ts';

/** All that is fetched of a scheme's decisions stands under it. */
export function decisionsKey(schemeId: string): readonly string[] {
  return [...schemeQuery(schemeId).queryKey, 'decisions'];
}
