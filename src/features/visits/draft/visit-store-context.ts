import { createContext, use } from 'react';
import { indexedVisitStore } from './indexed-visit-store.ts';
import type { VisitStore } from './visit-store.ts';

/** The store of this browser, opened when it is first asked. */
export const VisitStoreContext = createContext<VisitStore>(indexedVisitStore('groundsill-visits'));

export function useVisitStore(): VisitStore {
  return use(VisitStoreContext);
}
