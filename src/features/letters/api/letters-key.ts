import { schemeQuery } from '../../schemes/api/get-scheme.ts';

/** All that is fetched of a scheme's letters stands under it. */
export function lettersKey(schemeId: string): readonly string[] {
  return [...schemeQuery(schemeId).queryKey, 'letters'];
}
