import { createContext, use } from 'react';
import type { SchemeAnswer } from '../../../shared/schemas/schemes.ts';

export const SchemeContext = createContext<SchemeAnswer | null>(null);

/** The scheme of the address, on the pages of a scheme. */
export function useScheme(): SchemeAnswer {
  const scheme = use(SchemeContext);
  if (scheme === null) throw new Error('This page stands outside of a scheme.');
  return scheme;
}
